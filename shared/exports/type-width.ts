/** Advance widths of Source Sans 3 Regular, thousandths of the type size, from space to tilde. */
const advances: readonly number[] = [
  200, 289, 426, 497, 497, 824, 609, 249, 303, 303, 418, 497, 249, 311, 249, 350, 497, 497, 497,
  497, 497, 497, 497, 497, 497, 497, 249, 249, 497, 497, 497, 425, 847, 544, 588, 571, 615, 527,
  494, 617, 652, 263, 480, 579, 486, 727, 647, 664, 566, 664, 569, 534, 536, 645, 515, 786, 513,
  476, 539, 303, 350, 303, 497, 500, 542, 504, 553, 456, 555, 496, 292, 504, 544, 246, 247, 495,
  255, 829, 547, 542, 555, 555, 347, 419, 338, 544, 467, 719, 446, 467, 425, 303, 241, 303, 497,
];

/** For letters outside ASCII: as wide as a capital, so that a line is broken rather too early. */
const other = 660;

/** Width of a line of Source Sans 3 Regular, mm; exact for ASCII, a little generous beyond it. */
export const typeWidth = (text: string, size: number): number =>
  [...text].reduce(
    (sum, letter) => sum + (advances[(letter.codePointAt(0) ?? 0) - 32] ?? other),
    0,
  ) *
  (size / 1000);

/** Lines of at most `width` mm, broken between words; a word longer than a line is cut. */
export function wrap(text: string, size: number, width: number): readonly string[] {
  const lines: string[] = [];
  let current = '';
  for (const word of text.split(/[ \t\n]+/u).filter((each) => each !== '')) {
    const longer = current === '' ? word : `${current} ${word}`;
    if (typeWidth(longer, size) <= width) {
      current = longer;
      continue;
    }
    if (current !== '') lines.push(current);
    current = shorten(word, size, width);
  }
  return current === '' ? lines : [...lines, current];
}

/** The text, or as much of it as fits in `width` mm with an ellipsis. */
export function shorten(text: string, size: number, width: number): string {
  if (typeWidth(text, size) <= width) return text;
  const letters = [...text];
  while (letters.length > 0 && typeWidth(`${letters.join('')}…`, size) > width) letters.pop();
  return `${letters.join('').trimEnd()}…`;
}
