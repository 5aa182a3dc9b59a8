const tokens = [
  'ground',
  'paper',
  'ink',
  'slate',
  'brass',
  'madder',
  'verdigris',
  'level',
] as const;
type Token = (typeof tokens)[number];

export type Colours = Readonly<Record<Token, string>>;

/** The colour tokens as the page shows them now; the canvas cannot read CSS variables itself. */
export function readColours(beside: HTMLElement): Colours {
  const probe = document.createElement('span');
  beside.append(probe);
  const read = tokens.map((token): [Token, string] => {
    probe.style.color = `var(--${token})`;
    return [token, getComputedStyle(probe).color];
  });
  probe.remove();
  return everyToken(read);
}

/** The pairs hold every token: they were made from the list of them. */
const everyToken = (pairs: readonly [Token, string][]): Colours =>
  Object.fromEntries(pairs) as Colours;
