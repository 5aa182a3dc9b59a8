import { z } from 'zod';
import { bustDartRuleWords } from '../drafts/bodice-block/bust-dart-words.ts';
import {
  type BodiceBlockCard,
  type BodiceBlockStyle,
  bodiceBlockLabels,
  bodiceBlockLengths,
  bustDartRules,
  dartPlaces,
} from '../drafts/bodice-block/style-card.ts';
import {
  type SkirtBlockCard,
  type SkirtBlockStyle,
  type SkirtLength,
  skirtLengthWords,
} from '../drafts/skirt-block/style-card.ts';

type Words = { readonly label: string; readonly hint: string };

const length = ({ label, hint }: Words) => z.number().describe(`${label}, mm. ${hint}`);
const skirtLength = (key: SkirtLength) => length(skirtLengthWords[key]);

const rules = bustDartRules.map((rule) => `${rule}: ${bustDartRuleWords[rule]}`).join(' ');

const bodiceEase = z.strictObject({
  bust: length(bodiceBlockLengths['ease.bust']),
  waist: length(bodiceBlockLengths['ease.waist']),
});
const bodice = {
  armholeDrop: length(bodiceBlockLengths.armholeDrop),
  shoulderEase: length(bodiceBlockLengths.shoulderEase),
  bustDartRule: z.enum(bustDartRules).describe(`${bodiceBlockLabels.bustDartRule}. ${rules}`),
  bustDart: z.enum(dartPlaces).describe(`${bodiceBlockLabels.bustDart}, the seam it is sewn into.`),
};

const skirtEase = z.strictObject({
  waist: skirtLength('ease.waist'),
  hip: skirtLength('ease.hip'),
});
const skirt = { seat: skirtLength('seat'), length: skirtLength('length') };

/** A bodice block's style with every choice made, as a draft tells it. */
export const bodiceBlockStyle = z.strictObject({
  ease: bodiceEase,
  ...bodice,
}) satisfies z.ZodType<BodiceBlockStyle>;

/** Shape of a bodice block's style card; bounds are the engine's to say. */
export const bodiceBlockCard = z
  .strictObject({ ease: bodiceEase.partial(), ...bodice })
  .partial() satisfies z.ZodType<BodiceBlockCard>;

/** A skirt block's style with every choice made, as a draft tells it. */
export const skirtBlockStyle = z.strictObject({
  ease: skirtEase,
  ...skirt,
}) satisfies z.ZodType<SkirtBlockStyle>;

/** Shape of a skirt block's style card; bounds are the engine's to say. */
export const skirtBlockCard = z
  .strictObject({ ease: skirtEase.partial(), ...skirt })
  .partial() satisfies z.ZodType<SkirtBlockCard>;
