import { allowancesOf } from '../drafting/edge-allowance.ts';
import type { Piece } from '../drafting/piece.ts';
import type { Drafted } from '../engine/drafted.ts';
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
export function levelRows(draft: Drafted, unit: Unit): readonly Row[] {
  const { levels, bodyLevels } = draft;
  return [
    { kind: 'heading', text: `Levels, ${unit} from the waist` },
    ...struckLevels(levels).map(([level, y]): Row => {
      const off = y - bodyLevels.waist;
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
  { kind: 'heading', text: `${title}, ${unit} · N notch` },
  { kind: 'point', cells: ['', 'point', 'from centre', 'level'] },
  ...points.map(({ number, what, at, level, offLevel, notch }): Row => {
    const off = chalked(Math.abs(offLevel), unit);
    const shown = off === chalked(0, unit) ? '' : ` ${offLevel < 0 ? '↑' : '↓'} ${off}`;
    return {
      kind: 'point',
      cells: [
        String(number),
        notch ? `N ${what}` : what,
        chalked(at.x, unit),
        `${levelLetters[level]}${shown}`,
      ],
    };
  }),
];

/** What the lines are, and what is added outside them. */
export function allowanceRows(draft: Drafted, unit: Unit): readonly Row[] {
  return [
    { kind: 'heading', text: `Add outside the lines, ${unit}` },
    ...allowancesOf(draft.pieces, draft.inputs.rules).map(({ name, wide }): Row => ({
      kind: 'pair',
      name,
      value: chalked(wide, unit),
    })),
  ];
}

/** What to cut of each piece. */
export const pieceRows = (pieces: readonly Piece[]): readonly Row[] => [
  { kind: 'heading', text: 'Pieces' },
  ...pieces.map((each): Row => ({ kind: 'pair', name: each.title, value: each.cut })),
];
