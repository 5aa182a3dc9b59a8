import { edge, mouth } from '../drafting/outline.ts';
import type { Dart, Edge } from '../drafting/piece.ts';
import type { WaistLine } from '../drafting/waist-line.ts';
import { reverse } from '../geometry/curve.ts';
import { line } from '../geometry/path.ts';
import { point } from '../geometry/point.ts';

const letters = 'abc';
const stretchName = (k: number, count: number): string =>
  count === 1 ? 'waist' : `waist-${letters[k] ?? String(k)}`;
const mouthName = (k: number): string => `waist-mouth-${letters[k] ?? String(k)}`;

/** The edges of a waist line from the centre out, the mouths of its darts among them. */
export const waistEdges = ({ stretches, mouths }: WaistLine): readonly Edge[] =>
  stretches.flatMap((path, k) => {
    const own = edge(stretchName(k, stretches.length), 'seam', path);
    const open = mouths[k];
    return open ? [own, mouth(mouthName(k), open.centre, open.side)] : [own];
  });

/** Those edges travelled from the side to the centre, as the lower edge of a bodice is. */
export const waistEdgesBack = (waist: WaistLine): readonly Edge[] =>
  [...waistEdges(waist)].reverse().map((each) => ({ ...each, path: reverse(each.path) }));

/** The darts of a waist line, with straight legs to tips at these heights. */
export const waistDarts = (waist: WaistLine, tips: readonly number[]): readonly Dart[] =>
  waist.mouths.map(({ centre, side }, k): Dart => {
    const tip = point((centre.x + side.x) / 2, tips[k] ?? centre.y);
    return {
      name: k === 0 ? 'waist' : `waist-${k + 1}`,
      tip: tip.y < centre.y ? 'above' : 'below',
      centreLeg: [line(centre, tip)],
      sideLeg: [line(side, tip)],
      mouth: mouthName(k),
      pressed: 'centre',
    };
  });

/** Cloth left between a dart and its neighbour, the centre line or the side, mm. */
const clothBeside = 8;

/** Whether the darts of a waist line leave no cloth between each other, the centre line and the side. */
export const isCrowded = ({ stretches }: WaistLine): boolean =>
  stretches.some((stretch) => {
    const from = stretch[0]?.from.x ?? 0;
    return (stretch.at(-1)?.to.x ?? 0) - from < clothBeside;
  });
