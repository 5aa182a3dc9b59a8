import type { LineChoice, PrintOrder } from '../sheets/print-order.ts';
import type { Pen } from './drawing.ts';

/** Which lines of a piece are drawn, and how. */
export type LineStyle = {
  readonly lines: LineChoice;
  readonly inkSaving: boolean;
  /** Scale of the piece; below one nobody is to cut, and the cutting line is no whole line. */
  readonly scale: number;
};

/** Lines as on the drafting table. */
export const plainLines: LineStyle = { lines: 'both', inkSaving: false, scale: 1 };

/** Parts of a line's width, and of the white in its dashes, where ink is saved. */
const thinner = 0.5;
const sparser = 1.5;

/** A pen as this style draws with it: its width where ink is plentiful, thinner and sparser where not. */
export function penIn(pen: Pen, { inkSaving, scale }: LineStyle): Pen {
  if (!inkSaving && scale === 1) return pen;
  const width = pen.width * (inkSaving ? thinner : 1) * (scale < 1 ? thinner : 1);
  const dash = pen.dash?.map((each, i) =>
    i % 2 === 0
      ? each * Math.max(scale, 0.5)
      : each * Math.max(scale, 0.5) * (inkSaving ? sparser : 1),
  );
  return { ...pen, width: Math.max(0.12, width), ...(dash ? { dash } : {}) };
}

/** How the marks of a piece shrink with it: less than its lines, to be seen. */
export const markScale = ({ scale }: LineStyle): number => (scale < 1 ? 0.6 : 1);

const scaleNames = new Map([
  [0.5, 'half scale'],
  [0.25, 'quarter scale'],
]);

/** `half scale, do not cut`, for drawings that are not at true scale; nothing for those that are. */
export const notToCut = ({ scale }: Pick<PrintOrder, 'scale'>): string | undefined => {
  const name = scaleNames.get(scale);
  return name && `${name}, do not cut`;
};

/** The last lines of a label: what the lines of a piece mean, and how it is printed. */
export function labelNotes({
  lines,
  scale,
}: Pick<PrintOrder, 'lines' | 'scale'>): readonly string[] {
  const small = notToCut({ scale });
  if (small !== undefined) return [small];
  const meaning = {
    both: 'seam line dashed · cut on the solid line',
    finished: 'finished line only · add the allowances',
    cutting: 'cutting line only · allowances are in it',
  }[lines];
  return [meaning, 'print at 100 %'];
}
