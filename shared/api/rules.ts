import { z } from 'zod';
import {
  armholePlaces,
  balanceLevels,
  labelLines,
  type BalanceLevel,
  type HouseRules,
} from '../drafting/house-rules.ts';
import { balanced, houseRulePresets } from '../drafting/house-rule-presets.ts';

type Balance = { [L in BalanceLevel]: z.ZodNumber };

/** `fromEntries` forgets the keys; they are those of the list. */
const balances = () =>
  Object.fromEntries(
    balanceLevels.map((level) => [
      level,
      z.number().describe(`Front quarter over the plain one at ${level}, mm.`),
    ]),
  ) as Balance;

const balance = z.strictObject(balances());

const allowance = z.strictObject({
  seam: z.number().describe('Plain seams, mm.'),
  side: z.number().describe('Side seams, mm.'),
  zip: z.number().describe('Centre back with the zip, mm.'),
  top: z.number().describe('Enclosed top edge, mm.'),
  hem: z.number().describe('Circular hem, mm.'),
  waist: z.exactOptional(z.number()).describe('Waist seam, mm; else as plain seams.'),
  princess: z.exactOptional(z.number()).describe('Princess seams, mm; else as plain seams.'),
  armhole: z.exactOptional(z.number()).describe('Armhole edge, mm; else as the top edge.'),
  facing: z.exactOptional(z.number()).describe('Free edge of a facing, mm; else as the top edge.'),
  straightHem: z.exactOptional(z.number()).describe('Hem that hardly bends, mm; else as hem.'),
});

const label = z
  .exactOptional(z.array(z.enum(labelLines)).max(labelLines.length).readonly())
  .describe('Lines on the label of every piece beside its name and what to cut; all if left out.');

const intakes = z.strictObject({
  topLine: z.number().describe('At the height of the peak, mm.'),
  underbust: z.number().describe('At the under-bust, mm.'),
  waistSeam: z.number().describe('At a raised waist seam, mm.'),
  waist: z.number().describe('At the waist, mm.'),
});

/** House rules with every value, as a draft tells them. */
export const houseRules = z.strictObject({
  balance,
  cupShare: z
    .number()
    .describe("Part of the bust's fullness beyond a middle cup that the front gains, 0 to 0.5."),
  sideShare: z.number().describe('Part of the waist suppression that the side seam takes, 0 to 1.'),
  dartWidest: z.number().describe('Widest intake sewn in one dart, mm.'),
  dartClearance: z.number().describe('Darts stop this short of the bust point, mm.'),
  // Rules kept before these were asked say nothing of them.
  peakOverBust: z
    .number()
    .default(balanced.peakOverBust)
    .describe(
      "Height of a strapless top line's peak over the bust where the style leaves it open, mm.",
    ),
  shoulderDrop: z
    .number()
    .default(balanced.shoulderDrop)
    .describe(
      'Side neck level down to the peak, off the shoulder, where the style leaves it open, mm.',
    ),
  armholeAt: z
    .enum(armholePlaces)
    .default(balanced.armholeAt)
    .describe('Where a gown off the shoulder ends: width across, or shoulder width.'),
  intakes: z
    .exactOptional(intakes)
    .describe('Intakes given outright, front and back alike; the side seam takes the rest.'),
  allowance,
  label,
}) satisfies z.ZodType<HouseRules>;

/** What a rules file may hold: a preset to start from (balanced when left out) and whatever differs from it. */
export const rulesCard = z.strictObject({
  preset: z.enum(['balanced', 'quarterRule']).optional().describe('The house rules to start from.'),
  ...houseRules.partial().shape,
  armholeAt: z.enum(armholePlaces).optional(),
  peakOverBust: z.number().optional(),
  shoulderDrop: z.number().optional(),
  balance: balance.partial().optional(),
  allowance: allowance.partial().optional(),
});

/** Fills a rules file up from the preset it starts from. */
export function fillRules(card: z.output<typeof rulesCard>): HouseRules {
  const base = houseRulePresets[card.preset ?? 'balanced'];
  return {
    balance: merged(base.balance, card.balance),
    cupShare: card.cupShare ?? base.cupShare,
    sideShare: card.sideShare ?? base.sideShare,
    dartWidest: card.dartWidest ?? base.dartWidest,
    dartClearance: card.dartClearance ?? base.dartClearance,
    peakOverBust: card.peakOverBust ?? base.peakOverBust,
    shoulderDrop: card.shoulderDrop ?? base.shoulderDrop,
    armholeAt: card.armholeAt ?? base.armholeAt,
    ...(card.intakes === undefined ? {} : { intakes: card.intakes }),
    allowance: merged(base.allowance, card.allowance),
    ...(card.label === undefined ? {} : { label: card.label }),
  };
}

/** What is given, over what is not: an open value never hides the preset's. */
const merged = <T extends Readonly<Record<string, number>>>(
  base: T,
  given: { readonly [K in keyof T]?: number | undefined } | undefined,
): T =>
  Object.fromEntries(Object.entries(base).map(([key, value]) => [key, given?.[key] ?? value])) as T;
