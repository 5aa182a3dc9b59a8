import type { Unit } from '../units/said.ts';
import type { Mark } from './drawing.ts';
import { box, pens, stroke, strokes, words } from './marks.ts';

/** Height of the rod on paper, mm. */
const high = 5;

/**
 * A measuring rod along the top of a page in the maker's unit: centimetres with every fifth longer, or
 * inches with their halves. On a sheet drawn smaller, by `scale`, it reads full size.
 */
export function rod(x: number, y: number, width: number, unit: Unit, scale = 1): readonly Mark[] {
  const step = (unit === 'cm' ? 10 : scale < 1 ? 25.4 : 12.7) * scale;
  const every = unit === 'cm' ? 5 : scale < 1 ? 6 : 2;
  const value = (i: number): number => (unit === 'cm' || scale < 1 ? i : i / 2);
  const count = Math.floor((width + 1e-9) / step);
  const ticks = Array.from({ length: count + 1 }, (_, i) => i);
  const named = ticks.filter((i) => i > 0 && i % every === 0 && i * step < width - 8);
  return [
    box(pens.frame, x, y, width, high),
    strokes(
      pens.hairline,
      ...ticks.map((i) =>
        stroke(x + i * step, y, x + i * step, y + (i % every === 0 ? high * 0.7 : high * 0.4)),
      ),
    ),
    ...named.map((i) =>
      words(String(value(i)), x + i * step + 0.8, y + high - 0.9, 2.4, {
        grey: 0.3,
      }),
    ),
    words(unit, x + width - 1.5, y + high - 0.9, 2.4, { anchor: 'end', grey: 0.3 }),
  ];
}
