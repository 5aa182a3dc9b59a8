export type PaperName = 'A4' | 'Letter';

/** A sheet standing upright, millimetres. */
export type Paper = { readonly name: PaperName; readonly width: number; readonly height: number };

/** The papers of home printers: ISO 216 A4, and US Letter (8 1/2 x 11 in), exact. */
export const papers: { readonly [N in PaperName]: Paper } = {
  A4: { name: 'A4', width: 210, height: 297 },
  Letter: { name: 'Letter', width: 215.9, height: 279.4 },
};

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
