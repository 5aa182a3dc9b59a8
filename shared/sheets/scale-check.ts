import { millimetresPerInch } from '../units/format-length.ts';
import { parseLength } from '../units/parse-length.ts';
import { type Said, type Unit, fine, mm, said } from '../units/said.ts';
import { paperOf, papers } from './papers.ts';
import type { CustomPaper, SheetName } from './print-order.ts';

/** The squares of the cover that a maker measures; mm. */
export const squareSides = { metric: 100, inch: 4 * millimetresPerInch } as const;
export type SquareName = keyof typeof squareSides;

/** What the printed square measures along the page's short and long side, and the paper it was ordered for; mm. */
export type MeasuredSquare = {
  readonly square: SquareName;
  readonly across: number;
  readonly down: number;
  readonly paper: SheetName | CustomPaper;
};

/** What a measured square tells: what went wrong, and how to print again; cut only where it is `true`. */
export type ScaleFinding = {
  readonly kind: 'true' | 'wrong unit' | 'wrong paper' | 'fit to page' | 'stretched' | 'scaled';
  readonly what: Said;
  readonly again: Said;
};

/**
 * A figure typed without its unit that is far from the square's side in the reader's unit, yet near it in
 * another: what was meant, with its unit (`97` for a reader of cm: `97 mm`). No answer where it has a unit, is
 * no figure, or makes sense as it stands.
 */
export function meantInstead(typed: string, unit: Unit, square: SquareName): string | undefined {
  const side = squareSides[square];
  const read = parseLength(typed, unit);
  if (!('mm' in read) || (read.mm >= side / 2 && read.mm <= side * 2)) return undefined;
  return (['mm', 'cm', 'in'] as const)
    .map((other) => `${typed.trim()} ${other}`)
    .find((text) => {
      // A figure that has its unit already takes no second one.
      const meant = parseLength(text, unit);
      return 'mm' in meant && Math.abs(meant.mm / side - 1) <= 0.2;
    });
}

/** A ruler is read to half a millimetre (common practice, no source). */
const readTo = 0.5;

/** Two directions differ where they are further apart than this part of themselves. */
const unlike = 0.007;

/** How near a ratio lies to one that has a name. */
const alike = 0.006;

/** White a home printer needs at each edge, mm, from its least to its most (common practice, no source). */
const printerWhite = { least: 3, most: 6.4 } as const;

const near = (ratio: number, wanted: number, by = alike): boolean =>
  Math.abs(ratio / wanted - 1) <= by;

/** Per cent to one decimal. */
const percent = (ratio: number): string => `${(Math.round(ratio * 1000) / 10).toFixed(1)} %`;

/** Ratios a length comes to when its number was meant in another unit. */
const unitSlips = [
  millimetresPerInch / 10,
  10 / millimetresPerInch,
  millimetresPerInch,
  10,
  0.1,
] as const;

type Page = { readonly width: number; readonly height: number };

/** How much a page shrinks to lie on another, whole or inside that printer's white. */
const fitOn = (page: Page, onto: Page, white: number): number =>
  Math.min((onto.width - 2 * white) / page.width, (onto.height - 2 * white) / page.height);

/** Papers that are mistaken for one another: A4 and Letter. */
const mistaken = [
  { ordered: papers.A4, loaded: papers.Letter },
  { ordered: papers.Letter, loaded: papers.A4 },
] as const;

const actualSize = said`In the print dialog choose “actual size” or 100 %, not “fit”, “shrink” or “scale to paper”, and print the cover alone first.`;

function wrongPaper(
  ratio: number,
  paper: Page & { readonly name: string },
): ScaleFinding | undefined {
  const pair = mistaken.find(({ ordered }) => ordered.name === paper.name);
  if (!pair) return undefined;
  const { ordered, loaded } = pair;
  const whole = near(ratio, fitOn(ordered, loaded, 0));
  const inside = [printerWhite.least, printerWhite.most].map((white) =>
    fitOn(ordered, loaded, white),
  );
  const within = ratio >= Math.min(...inside) - alike && ratio <= Math.max(...inside) + alike;
  const alsoShrunk = isShrunk(ratio, paper);
  if (!whole && (!within || alsoShrunk)) return undefined;
  return {
    kind: 'wrong paper',
    what: said`Everything came out at ${percent(ratio)}: ${ordered.name} pages were fitted onto ${loaded.name} paper${alsoShrunk ? ', or shrunk to fit inside the printer’s margins: look which paper is in it' : ''}.`,
    again: said`Load ${ordered.name}, or choose ${loaded.name} in the print room and make the sheets again. ${actualSize}`,
  };
}

/** Whether a page was shrunk into the white of a printer that has its own paper in it. */
function isShrunk(ratio: number, paper: Page): boolean {
  const { least, most } = printerWhite;
  return ratio <= fitOn(paper, paper, least) + alike && ratio >= fitOn(paper, paper, most) - alike;
}

function stretched(across: number, down: number): ScaleFinding {
  const [which, ratio] =
    Math.abs(across - 1) > Math.abs(down - 1)
      ? (['across', across] as const)
      : (['down', down] as const);
  return {
    kind: 'stretched',
    what: said`The square is no square: ${which} the page it is ${percent(ratio)} of what it should be, the other way ${percent(which === 'across' ? down : across)}. The printer or its driver draws the paper through unevenly.`,
    again: said`Set the paper to plain, switch off borderless printing and every enlarging in the driver, and print the cover again; if it stays so, use another printer or a copy shop. No setting of the scale mends this.`,
  };
}

function uniform(ratio: number, paper: ReturnType<typeof paperOf>): ScaleFinding {
  const wrong = wrongPaper(ratio, paper);
  if (wrong) return wrong;
  if (!paper.roll && isShrunk(ratio, paper)) {
    return {
      kind: 'fit to page',
      what: said`Everything came out at ${percent(ratio)}: the pages were shrunk to fit inside the printer’s margins.`,
      again: actualSize,
    };
  }
  const folded = near(ratio, Math.SQRT1_2, 0.04) || near(ratio, 0.5, 0.06);
  const grown = near(ratio, Math.SQRT2, 0.04);
  const guess = folded
    ? said` Several pages were put on one sheet, or a smaller paper was in the printer.`
    : grown
      ? said` The pages were enlarged onto a paper of the next size.`
      : said``;
  return {
    kind: 'scaled',
    what: said`Everything came out at ${percent(ratio)} of its size.${guess}`,
    again: said`${actualSize} If the dialog has only a percentage, it stood at about ${percent(ratio)}: set it to 100 %.`,
  };
}

/**
 * What the measured square says about the print: true to scale within half a millimetre, or what went
 * wrong and how to print again. Lengths in mm; no judgement is made on a length of zero or less.
 */
export function scaleCheck({
  square,
  across,
  down,
  paper,
}: MeasuredSquare): ScaleFinding | undefined {
  if (!(across > 0 && down > 0)) return undefined;
  const side = squareSides[square];
  const [wide, high] = [across / side, down / side];
  if (Math.abs(across - side) <= readTo && Math.abs(down - side) <= readTo) {
    return {
      kind: 'true',
      what: said`True to scale: the square measures ${fine(across)} by ${fine(down)}.`,
      again: said`Print the other sheets from the same dialog with the same settings, and look at the small square of each.`,
    };
  }
  const slip = (ratio: number): boolean => unitSlips.some((each) => near(ratio, each, 0.03));
  if (slip(wide) || slip(high)) {
    return {
      kind: 'wrong unit',
      what: said`${mm(across)} by ${mm(down)} cannot be this square of ${mm(side)}: the number seems to be in another unit.`,
      again: said`Type the unit with the number, as in “100 mm”, “10 cm” or “4 in”, and check again before anything is printed.`,
    };
  }
  if (Math.abs(wide / high - 1) > unlike) return stretched(wide, high);
  return uniform((wide + high) / 2, paperOf(paper));
}
