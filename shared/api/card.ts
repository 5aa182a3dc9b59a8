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

/** Shape of a measure card on the wire and in a file; whether it can be drawn is `checkCard`'s to say. */
export const measureCard = z.strictObject({
  name: z.string().max(80).optional().describe('Whose card it is, at most 80 letters.'),
  date: z.iso.date().optional().describe('Day the measures were taken, such as 2026-11-14.'),
  ...core(),
  ...further(),
}) satisfies z.ZodType<MeasureCard>;
