import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import { figure } from './xml.ts';

const at = (p: Point): string => `${figure(p.x)} ${figure(p.y)}`;

/** A path in SVG's notation, mm to a thousandth; closed on its start where asked. */
export function pathData(path: Path, closed = false): string {
  const first = path[0];
  if (!first) return '';
  const strokes = path.map((each) =>
    each.kind === 'line' ? `L${at(each.to)}` : `C${at(each.c1)} ${at(each.c2)} ${at(each.to)}`,
  );
  return `M${at(first.from)}${strokes.join('')}${closed ? 'Z' : ''}`;
}
