import type { LabelLine } from '../drafting/house-rules.ts';
import type { Lettering, Piece } from '../drafting/piece.ts';
import { type FreePlace, type PaperSeams, freePlace, freeRows } from './free-run.ts';

/** What the label of every piece of a draft says besides the piece's own name and cut. */
export type LabelFacts = {
  /** Whose card, as typed; absent where the card has no name. */
  readonly cardName?: string | undefined;
  /** Day of the card, `2026-11-14`. */
  readonly date?: string | undefined;
  readonly draftNumber: string;
  /** What it is cut from: `cloth`, `lining`. */
  readonly cloth: string;
  /** The size it is cut in: `made to measure`, or the size of a nest. */
  readonly size?: string;
  /** Lines the house wants beside name and cut; all of them where it says nothing. */
  readonly says?: readonly LabelLine[];
};

/** How a label is printed, where it is not the plain one at true scale. */
export type LabelPrint = {
  /** Seams between sheets of paper that it is not to lie across. */
  readonly seams?: PaperSeams;
  /** Its last lines, instead of what the lines mean and how to print. */
  readonly notes?: readonly string[];
  /** Scale of the drawing; below one the letters are smaller, and still legible. */
  readonly scale?: number;
};

/** What the lines of a piece mean, and how it is printed. */
const plainNotes = { lines: 'seam line dashed · cut on the solid line', scale: 'print at 100 %' };

const wants = ({ says }: LabelFacts, line: LabelLine): boolean => says?.includes(line) ?? true;

const notesFor = (facts: LabelFacts): readonly string[] =>
  (['lines', 'scale'] as const)
    .filter((line) => wants(facts, line))
    .map((line) => plainNotes[line]);

type Line = { readonly text: string; readonly size: number };

/** How large the lettering is tried, from the best to the smallest: sizes in mm and widest line. */
const layouts = [
  { title: 7, text: 5, note: 4, width: 130 },
  { title: 6, text: 4.5, note: 4, width: 80 },
  { title: 5, text: 4, note: 4, width: 54 },
  { title: 4.5, text: 4, note: 4, width: 46 },
  { title: 4, text: 4, note: 4, width: 38 },
  { title: 4, text: 4, note: 4, width: 30 },
] as const;

/** The same for drawings at a half and a quarter. */
const smallLayouts = [
  { title: 4, text: 3, note: 2.8, width: 60 },
  { title: 3.2, text: 2.8, note: 2.6, width: 40 },
  { title: 2.8, text: 2.4, note: 2.4, width: 30 },
  { title: 2.4, text: 2.2, note: 2.2, width: 21 },
  { title: 2.2, text: 2.2, note: 2.2, width: 14 },
] as const;

type Sizes = (typeof layouts)[number] | (typeof smallLayouts)[number];

/** Longest name written out, characters. */
const longestName = 40;

/** Height of a line over the size of its letters. */
const leading = 1.35;

const narrow = " .,:;'’!|ijl·()";
const broad = 'mwMW%@…';

function letterWidth(letter: string): number {
  if (narrow.includes(letter)) return 0.36;
  if (broad.includes(letter) || letter >= '\u2e80') return 1;
  return (letter >= 'A' && letter <= 'Z') || letter >= '\u00c0' ? 0.72 : 0.6;
}

/** Width over height of the letters below this code, reckoned once. */
const common = 0x250;

/** On the safe side of the sans-serif faces a label may be drawn in. */
const widths = Float64Array.from({ length: common }, (_, code) =>
  letterWidth(String.fromCharCode(code)),
);

/** Width of a text, mm. */
function textWidth(text: string, size: number): number {
  let ems = 0;
  for (let i = 0; i < text.length; i += 1) ems += widths[text.charCodeAt(i)] ?? 1;
  return ems * size;
}

/** A typed text on one line: no control characters, no runs of spaces. */
const plain = (text: string): string => text.replace(/[\p{C}\s]+/gu, ' ').trim();

/** A text of at most so many characters, shortened with an ellipsis. */
function shortened(text: string, most: number): string {
  const letters = Array.from(text);
  return letters.length <= most
    ? text
    : `${letters
        .slice(0, most - 1)
        .join('')
        .trimEnd()}…`;
}

/** A text shortened with an ellipsis until it is no wider than `width` mm. */
function fitted(text: string, size: number, width: number): string {
  let most = Array.from(text).length;
  let shown = text;
  while (most > 1 && textWidth(shown, size) > width) {
    most -= 1;
    shown = shortened(text, most);
  }
  return shown;
}

/** Parts put together again, with `joint` between them, as many to a line as `width` mm hold. */
function gathered(parts: readonly string[], joint: string, size: number, width: number): string[] {
  const lines: string[] = [];
  let room = 0;
  for (const part of parts) {
    const own = textWidth(part, size);
    const more = textWidth(joint, size) + own;
    const last = lines.at(-1);
    if (last !== undefined && more <= room) {
      lines[lines.length - 1] = last + joint + part;
      room -= more;
    } else {
      lines.push(part);
      room = width - own;
    }
  }
  return lines;
}

/** A line broken at its dots, else between words, so that no part is wider than `width` mm. */
function wrapped({ text, size }: Line, width: number): readonly Line[] {
  if (textWidth(text, size) <= width) return [{ text, size }];
  return gathered(text.split(' · '), ' · ', size, width)
    .flatMap((part) =>
      textWidth(part, size) <= width ? [part] : gathered(part.split(' '), ' ', size, width),
    )
    .map((part) => ({ text: fitted(part, size, width), size }));
}

/** What a piece is cut from: the gown's own cloth, unless it says another. */
const clothOf = ({ cloth }: Piece, facts: LabelFacts): string => cloth ?? plain(facts.cloth);

function label(
  piece: Piece,
  facts: LabelFacts,
  sizes: Sizes,
  notes: readonly string[],
  small: boolean,
): readonly Line[] {
  const card = [facts.cardName, facts.date]
    .map((each) => shortened(plain(each ?? ''), longestName))
    .filter((each) => each !== '')
    .join(' · ');
  const size = wants(facts, 'size') && facts.size !== undefined ? [plain(facts.size)] : [];
  const number = wants(facts, 'draft') ? [`draft ${facts.draftNumber}`] : [];
  const said = notes.map((text) => ({ text, size: sizes.note }));
  const lines: readonly Line[] = [
    { text: piece.title, size: sizes.title },
    ...(small ? said : []),
    { text: piece.cut, size: sizes.text },
    { text: wants(facts, 'card') ? card : '', size: sizes.text },
    { text: [...size, ...number, clothOf(piece, facts)].join(' · '), size: sizes.note },
    ...(small ? [] : said),
  ];
  return lines.filter((line) => line.text !== '').flatMap((line) => wrapped(line, sizes.width));
}

function set(lines: readonly Line[], place: FreePlace, width: number): readonly Lettering[] {
  const left = place.left + Math.max(0, (place.right - place.left - width) / 2);
  let y = place.top;
  return lines.map(({ text, size }) => {
    y += size * leading;
    return { text, size, at: { x: left, y: y - 0.35 * size } };
  });
}

/**
 * The label of a piece, line by line, in letters 4 to 7 mm high: where it fits inside the finished
 * outline clear of darts, grain line and drill points. A piece too small for all of it carries as many
 * lines as it holds, its name first; none where not even a short name would lie inside. `print` says how
 * it is printed on sheets of paper.
 */
export function lettering(
  piece: Piece,
  facts: LabelFacts,
  { seams, notes = notesFor(facts), scale = 1 }: LabelPrint = {},
): readonly Lettering[] {
  const free = freeRows(piece, seams, scale);
  let lines: readonly Line[] = [];
  for (const sizes of scale < 1 ? smallLayouts : layouts) {
    lines = label(piece, facts, sizes, notes, scale < 1);
    const width = Math.max(...lines.map((line) => textWidth(line.text, line.size)));
    const height = lines.reduce((sum, line) => sum + line.size * leading, 0);
    const place = freePlace(free, width, height);
    if (place) return set(lines, place, width);
  }
  for (let count = lines.length - 1; count > 0; count -= 1) {
    for (const least of scale < 1 ? [14, 7] : [36, 26, 16]) {
      const tallest = Math.max(...lines.slice(0, count).map((line) => line.size));
      const place = freePlace(free, least, count * tallest * leading);
      if (!place) continue;
      const run = place.right - place.left;
      const short = lines
        .slice(0, count)
        .map(({ text, size }) => ({ text: fitted(text, size, run), size }));
      return set(short, place, Math.max(...short.map((line) => textWidth(line.text, line.size))));
    }
  }
  return [];
}
