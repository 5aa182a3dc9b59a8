import type { Unit } from '#shared/units/said.ts';

/** A mark on the rod: how far along in pixels, how long it is, and its figure. */
export type RodMark = { readonly at: number; readonly long: boolean; readonly figure?: string };

/** Whole units between figures, and into how many parts each stretch is divided. */
const divisions: Record<Unit, readonly (readonly [step: number, parts: number])[]> = {
  in: [
    [1, 8],
    [2, 4],
    [4, 4],
    [8, 4],
    [12, 3],
    [24, 4],
    [48, 4],
  ],
  cm: [
    [1, 10],
    [2, 4],
    [5, 5],
    [10, 5],
    [20, 4],
    [50, 5],
    [100, 5],
  ],
};

const millimetres: Record<Unit, number> = { in: 25.4, cm: 10 };

/** Figures stand at least this many pixels apart. */
const room = 46;

/** Marks of the rod along one edge of the drawing: `origin` is where zero lies, in pixels. */
export function rodMarks(unit: Unit, scale: number, origin: number, length: number): RodMark[] {
  const perUnit = millimetres[unit] * scale;
  const [step, parts] = divisions[unit].find(([each]) => each * perUnit >= room) ??
    divisions[unit].at(-1) ?? [1, 1];
  const between = (step * perUnit) / parts;
  const first = Math.ceil(-origin / between);
  const last = Math.floor((length - origin) / between);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => {
    const count = first + index;
    const at = origin + count * between;
    return count % parts === 0
      ? { at, long: true, figure: String((count / parts) * step).replace('-', '−') }
      : { at, long: false };
  });
}
