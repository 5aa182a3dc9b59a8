import { endOf, pathLength, startOf } from '../geometry/curve.ts';
import { distance, point } from '../geometry/point.ts';
import type { Piece } from '../drafting/piece.ts';
import type { Draft } from '../engine/draft.ts';
import { formatInches, formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import { levelLetters } from './chalk-half.ts';
import { type ChalkPoint, struckLevels } from './chalk-points.ts';
import { levelTitles } from './level-titles.ts';

/** A line of the chalk sheet's tables: a heading, a sentence, or cells in columns. */
export type Row =
  | { readonly kind: 'heading'; readonly text: string }
  | { readonly kind: 'note'; readonly text: string }
  | { readonly kind: 'point'; readonly cells: readonly [string, string, string, string] }
  | { readonly kind: 'pair'; readonly name: string; readonly value: string };

/** A length as chalk and tape take it: cm to 0.1, inches to 1/8. */
export const chalked = (mm: number, unit: Unit): string =>
  unit === 'cm' ? formatLength(mm, 'cm') : formatInches(mm, 8);

/** Levels from the waist, which is chalked first. */
export function levelRows(draft: Draft, unit: Unit): readonly Row[] {
  const { levels } = draft;
  return [
    { kind: 'heading', text: `Levels, ${unit} from the waist` },
    ...struckLevels.map((level): Row => {
      const off = levels[level] - levels.waist;
      return {
        kind: 'pair',
        name: `${levelLetters[level]}  ${levelTitles[level]}`,
        value:
          Math.abs(off) < 0.5
            ? '0'
            : `${chalked(Math.abs(off), unit)} ${off < 0 ? 'above' : 'below'}`,
      };
    }),
  ];
}

/** Every point of a half: its number, what it is, from the centre line, from its level. */
export const pointRows = (
  title: string,
  points: readonly ChalkPoint[],
  unit: Unit,
): readonly Row[] => [
  { kind: 'heading', text: `${title}, ${unit}` },
  { kind: 'point', cells: ['', 'point', 'from centre', 'level'] },
  ...points.map(({ number, what, at, level, offLevel }): Row => {
    const off = chalked(Math.abs(offLevel), unit);
    const shown = off === chalked(0, unit) ? '' : ` ${offLevel < 0 ? '↑' : '↓'} ${off}`;
    return {
      kind: 'point',
      cells: [String(number), what, chalked(at.x, unit), `${levelLetters[level]}${shown}`],
    };
  }),
];

/** The flare as it is struck: two arcs from one point, and how far along them it goes. */
export function flareRows(pieces: readonly Piece[], unit: Unit): readonly Row[] {
  return pieces.flatMap((piece): readonly Row[] => {
    const hem = piece.edges.find((each) => each.kind === 'hem');
    const knee = piece.edges.find((each) => each.name.startsWith('knee'));
    const from = hem ? startOf(hem.path) : undefined;
    const to = hem ? endOf(hem.path) : undefined;
    const inner = knee ? startOf(knee.path) : undefined;
    if (!hem || !knee || !from || !to || !inner) return [];
    const apex = point(0, 0);
    const [near, far] = [distance(apex, inner), distance(apex, from)];
    const pair = (name: string, mm: number): Row => ({
      kind: 'pair',
      name,
      value: chalked(mm, unit),
    });
    return [
      { kind: 'heading', text: `${piece.title}, ${unit}` },
      {
        kind: 'note',
        text: piece.cut.includes('fold') ? `${piece.cut}, from the fold` : piece.cut,
      },
      pair('radius to the knee seam', near),
      pair('length, knee to hem', far - near),
      pair('radius to the hem', far),
      pair('along the knee seam', pathLength(knee.path)),
      pair('along the hem', pathLength(hem.path)),
      pair('straight across the hem', distance(from, to)),
    ];
  });
}

/** What the lines are, and what is added outside them. */
export function allowanceRows(draft: Draft, unit: Unit): readonly Row[] {
  const { allowance } = draft.inputs.rules;
  const pair = (name: string, mm: number): Row => ({
    kind: 'pair',
    name,
    value: chalked(mm, unit),
  });
  return [
    { kind: 'heading', text: `Add outside the lines, ${unit}` },
    pair('seams', allowance.seam),
    pair('side seams', allowance.side),
    pair('centre back and zip', allowance.zip),
    pair('top edge', allowance.top),
    pair('hem', allowance.hem),
  ];
}

/** What to cut of each piece. */
export const pieceRows = (pieces: readonly Piece[]): readonly Row[] => [
  { kind: 'heading', text: 'Pieces' },
  ...pieces.map((each): Row => ({ kind: 'pair', name: each.title, value: each.cut })),
];
