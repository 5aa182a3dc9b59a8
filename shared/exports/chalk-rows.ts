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

type Sector = {
  readonly title: string;
  readonly inner: number;
  readonly outer: number;
  readonly knee: number;
  readonly hem: number;
  readonly chord: number;
};

/** A flare piece as it is struck with chalk on a string; no answer for a piece without knee and hem. */
function sectorOf(piece: Piece): readonly Sector[] {
  const hem = piece.edges.find((each) => each.kind === 'hem');
  const knee = piece.edges.find((each) => each.name.startsWith('knee'));
  const [from, to] = hem ? [startOf(hem.path), endOf(hem.path)] : [];
  const start = knee ? startOf(knee.path) : undefined;
  if (!hem || !knee || !from || !to || !start) return [];
  const apex = point(0, 0);
  return [
    {
      title: piece.title,
      inner: distance(apex, start),
      outer: distance(apex, from),
      knee: pathLength(knee.path),
      hem: pathLength(hem.path),
      chord: distance(from, to),
    },
  ];
}

/** The flare: two arcs struck from one point, then how far along them each piece goes. */
export function flareRows(pieces: readonly Piece[], unit: Unit): readonly Row[] {
  const pair = (name: string, mm: number): Row => ({
    kind: 'pair',
    name,
    value: chalked(mm, unit),
  });
  const sectors = pieces.flatMap(sectorOf);
  const near = (a: Sector, b: Sector): boolean =>
    Math.abs(a.hem - b.hem) < 0.1 && Math.abs(a.inner - b.inner) < 0.1;
  const different = sectors.filter(
    (each, i) => sectors.findIndex((other) => near(each, other)) === i,
  );
  return different.flatMap((sector, i): readonly Row[] => {
    const before = different[i - 1];
    const same = sectors
      .filter((each) => near(each, sector))
      .map((each) => each.title.replace('Flare, ', ''));
    const struck: readonly Row[] =
      before &&
      Math.abs(before.inner - sector.inner) < 0.1 &&
      Math.abs(before.outer - sector.outer) < 0.1
        ? []
        : [
            { kind: 'heading', text: `Flare, struck from one point, ${unit}` },
            pair('radius to the knee seam', sector.inner),
            pair('length, knee to hem', sector.outer - sector.inner),
            pair('radius to the hem', sector.outer),
          ];
    return [
      ...struck,
      { kind: 'note', text: same.join('; ') },
      pair('along the knee seam', sector.knee),
      pair('along the hem', sector.hem),
      pair('straight across the hem', sector.chord),
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
