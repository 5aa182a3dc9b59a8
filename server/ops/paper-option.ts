import { checkPaper } from '#shared/sheets/check-order.ts';
import { type PrintOrder, type SheetName, sheetNames } from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import { speak } from '#shared/units/speak.ts';

const isSheetName = (text: string): text is SheetName => sheetNames.some((each) => each === text);

/**
 * Reads `--paper`: a name, or a sheet of one's own as `12x18`, `12in x 18in` or `305 mm x 457 mm`; one
 * unit at the end is that of both, none is the unit asked for. Else the sentence to refuse it with.
 */
export function readPaper(
  text: string,
  unit: Unit,
): { readonly paper: PrintOrder['paper'] } | { readonly refused: string } {
  if (isSheetName(text)) return { paper: text };
  const suffix = /[a-z"]*$/.exec(text)?.[0] ?? '';
  const [width, height, ...more] = text
    .split('x')
    .map((side) => parseLength(/[a-z"]/.test(side) ? side : side + suffix, unit));
  const isSize = width !== undefined && height !== undefined && more.length === 0;
  if (!isSize || !('mm' in width) || !('mm' in height)) {
    return {
      refused: `--paper must be one of ${sheetNames.join(', ')}, or a size such as 30.5x45.7cm; it is “${text}”.`,
    };
  }
  const paper = { width: width.mm, height: height.mm };
  const problems = checkPaper(paper).map((each) => speak(each.said, unit));
  return problems.length === 0 ? { paper } : { refused: `--paper: ${problems.join(' ')}` };
}
