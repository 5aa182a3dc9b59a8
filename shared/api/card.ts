import { z } from 'zod';
import { coreMeasures, furtherMeasures } from '../body/card.ts';
import type { CoreMeasure, FurtherMeasure, MeasureCard, MeasureKey } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';

const described = (key: MeasureKey) => {
  const { label, how, min, max, kind } = measureGuide[key];
  const unit = kind === 'angle' ? 'degrees' : 'mm';
  return z.number().describe(`${label}, ${unit}, ${min} to ${max}. ${how}`);
};

type Core = { [K in CoreMeasure]: z.ZodNumber };
type Further = { [K in FurtherMeasure]: z.ZodOptional<z.ZodNumber> };

/** `fromEntries` forgets the keys; they are those of the two lists. */
const core = () => Object.fromEntries(coreMeasures.map((key) => [key, described(key)])) as Core;
const further = () =>
  Object.fromEntries(furtherMeasures.map((key) => [key, described(key).optional()])) as Further;

/** At most so many warnings are overruled: a card has no more measures. */
const mostOverruled = 40;
export const longestReason = 200;

/** The warnings a maker keeps, each with a reason of at most 200 letters in the given form. */
export const overruledWith = <R extends z.ZodType<string>>(reason: R) =>
  z
    .array(
      z.strictObject({
        code: z.string().min(1).max(60).describe('Code of the warning, such as unlikely-girth.'),
        field: z.string().max(60).describe('Field it stands by, such as card.waistGirth.'),
        with: z
          .array(z.string().max(60))
          .max(4)
          .readonly()
          .optional()
          .describe('The other fields it names.'),
        reason: reason.describe('Why the measures are kept all the same, at most 200 letters.'),
      }),
    )
    .max(mostOverruled)
    .readonly()
    .optional()
    .describe('Warnings the maker has looked at and keeps.');

/** Shape of a measure card on the wire and in a file; whether it can be drawn is `checkCard`'s to say. */
export const measureCard = z.strictObject({
  name: z.string().max(80).optional().describe('Whose card it is, at most 80 letters.'),
  date: z.iso.date().optional().describe('Day the measures were taken, such as 2026-11-14.'),
  overruled: overruledWith(z.string().max(longestReason)),
  ...core(),
  ...further(),
}) satisfies z.ZodType<MeasureCard>;
