import type { CustomPaper, SheetName } from './print-order.ts';

/** Papers that every home printer takes. */
export type PaperName = 'A4' | 'Letter';

/** A sheet as it lies before the maker, millimetres. A roll is cut to the length its pieces need, `height` at most. */
export type Paper = {
  readonly name: string;
  readonly width: number;
  readonly height: number;
  readonly roll?: true;
};

/** The papers of home printers: ISO 216 A4, and US Letter (8 1/2 x 11 in), exact. */
export const papers: { readonly [N in PaperName]: Paper } = {
  A4: { name: 'A4', width: 210, height: 297 },
  Letter: { name: 'Letter', width: 215.9, height: 279.4 },
};

/** Longest strip printed off a roll, mm: a page of a PDF ends at 14 400 points, 5080 mm (ISO 32000). */
const longestStrip = 5000;

const roll = (name: string, width: number): Paper => ({
  name,
  width,
  height: longestStrip,
  roll: true,
});

/** All papers by name: ISO 216, US sizes of ANSI/ASME Y14.1, and the rolls of wide printers. */
export const sheetPapers: { readonly [N in SheetName]: Paper } = {
  ...papers,
  A3: { name: 'A3', width: 297, height: 420 },
  Legal: { name: 'Legal', width: 215.9, height: 355.6 },
  Tabloid: { name: 'Tabloid', width: 279.4, height: 431.8 },
  A1: { name: 'A1', width: 594, height: 841 },
  A0: { name: 'A0', width: 841, height: 1189 },
  'roll-36in': roll('36 in roll', 914.4),
  'roll-90cm': roll('90 cm roll', 900),
};

/** The paper of an order as it is named or typed, not yet turned. */
export const paperOf = (paper: SheetName | CustomPaper): Paper =>
  typeof paper === 'string' ? sheetPapers[paper] : { name: 'custom paper', ...paper };

/** Millimetres as PDF points, 1/72 in (ISO 32000). */
export const toPoints = (mm: number): number => (mm * 72) / 25.4;

/**
 * Sides of ISO 216 paper A`size`, mm: A0 is 841 x 1189, and each size is the one before cut across,
 * rounded down to a whole millimetre.
 */
export function isoA(size: number): { readonly width: number; readonly height: number } {
  let [width, height] = [841, 1189];
  for (let cut = 0; cut < size; cut += 1) [width, height] = [Math.floor(height / 2), width];
  return { width, height };
}
