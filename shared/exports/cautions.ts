import type { SheetPlan } from '../sheets/sheet-plan.ts';
import type { Unit } from '../units/said.ts';

/** What can hurt at the cutting table and at the party; printed wherever somebody is about to cut. */
export const cuttingCautions =
  'Shears, rotary blades and seam rippers cut; count pins and needles before a fitting. Irons and ' +
  'steam burn: let pressed seams cool. Cap or bind every boning end. Net, tulle and organza burn ' +
  'fast: keep them from candles and stoves. A narrow or trained hem trips on stairs and ' +
  'escalators: try it in the shoes. Local rules on cloth, labels and fire ' +
  'come first, and the advice of a qualified person before this sheet.';

/** How sheets become a pattern, in three sentences. */
export const assembly = [
  'Print at 100 % and measure both squares before cutting anything.',
  'Trim each sheet along its left and top lines where they name a neighbour to lay it on.',
  'Lay it on that neighbour’s glue strip, lozenge on lozenge: first along the rows, then row to row.',
] as const;

/** The same for a plan: where nothing is glued, the first sentence and that. */
export const assemblyOf = ({ plan }: Pick<SheetPlan, 'plan'>): readonly string[] =>
  plan.glueSeams > 0
    ? assembly
    : [assembly[0], 'No sheet is glued to another: every piece lies whole on its sheet.'];

/** The same in few lines, for a page whose room belongs to the figures, and how to chalk from it. */
export const chalkCautions = (unit: Unit): string =>
  'Chalk each piece by itself, with room for the allowances of both between neighbours. Figures are to the ' +
  `nearest ${unit === 'in' ? '1⁄8 in' : '0.1 cm'}. ` +
  'Shears, pins and irons hurt: mind them, and bind boning ends. Net and tulle burn fast; a narrow hem ' +
  'trips on stairs. Local rules and the advice of a qualified person come before this sheet.';
