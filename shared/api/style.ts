import { z } from 'zod';
import { easeLevels, styleLengths, topLineShapes } from '../drafts/gown/style-card.ts';
import type { EaseLevel, GownStyle, StyleCard, StyleLength } from '../drafts/gown/style-card.ts';
import { styleHints, styleLabels } from '../drafts/gown/style-labels.ts';
import type { StyleKey } from '../drafts/gown/style-limits.ts';

const described = (key: StyleKey) =>
  z
    .number()
    .describe(
      `${styleLabels[key]}, ${key === 'flareFraction' ? 'a number' : 'mm'}. ${styleHints[key]}`,
    );

type Lengths = { [K in StyleLength]: z.ZodNumber };
type Eases = { [L in EaseLevel]: z.ZodNumber };

/** `fromEntries` forgets the keys; they are those of the two lists. */
const lengths = () =>
  Object.fromEntries(styleLengths.map((key) => [key, described(key)])) as Lengths;
const eases = () =>
  Object.fromEntries(easeLevels.map((level) => [level, described(`ease.${level}`)])) as Eases;

const topLine = z.enum(topLineShapes);
const shaping = z.enum(['princess', 'darts']);
const ease = z.strictObject(eases());

/** A style with every choice made, as a draft tells it. */
export const gownStyle = z.strictObject({
  ...lengths(),
  topLine,
  shaping,
  ease,
}) satisfies z.ZodType<GownStyle>;

/** Shape of a style card: what is left out takes its default; bounds are `checkStyle`'s to say. */
export const styleCard = z
  .strictObject({ ...lengths(), topLine, shaping, ease: ease.partial() })
  .partial() satisfies z.ZodType<StyleCard>;
