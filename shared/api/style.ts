import { z } from 'zod';
import {
  easeLevels,
  isPlainNumber,
  styleChoices,
  styleLengths,
} from '../drafts/gown/style-card.ts';
import type { EaseLevel, GownStyle, StyleCard, StyleLength } from '../drafts/gown/style-card.ts';
import { styleHints, styleLabels } from '../drafts/gown/style-labels.ts';
import type { StyleKey } from '../drafts/gown/style-limits.ts';

const described = (key: StyleKey) =>
  z
    .number()
    .describe(`${styleLabels[key]}, ${isPlainNumber(key) ? 'a number' : 'mm'}. ${styleHints[key]}`);

type Lengths = { [K in StyleLength]: z.ZodNumber };
type Eases = { [L in EaseLevel]: z.ZodNumber };

/** `fromEntries` forgets the keys; they are those of the two lists. */
const lengths = () =>
  Object.fromEntries(styleLengths.map((key) => [key, described(key)])) as Lengths;
const eases = () =>
  Object.fromEntries(easeLevels.map((level) => [level, described(`ease.${level}`)])) as Eases;

const choices = {
  topLine: z.enum(styleChoices.topLine),
  shaping: z.enum(styleChoices.shaping),
  waistSeam: z.enum(styleChoices.waistSeam),
  flare: z.enum(styleChoices.flare),
  sleeve: z.enum(styleChoices.sleeve),
  closure: z.enum(styleChoices.closure),
  facing: z.enum(styleChoices.facing),
  lining: z.enum(styleChoices.lining),
  boning: z.enum(styleChoices.boning),
  cloth: z.enum(styleChoices.cloth),
};
const ease = z.strictObject(eases());

/** A style with every choice made, as a draft tells it. */
export const gownStyle = z.strictObject({
  ...lengths(),
  ...choices,
  ease,
}) satisfies z.ZodType<GownStyle>;

/** Shape of a style card: what is left out takes its default; bounds are `checkStyle`'s to say. */
export const styleCard = z
  .strictObject({ ...lengths(), ...choices, ease: ease.partial() })
  .partial() satisfies z.ZodType<StyleCard>;
