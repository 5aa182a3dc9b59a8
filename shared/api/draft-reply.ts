import { z } from 'zod';
import {
  coreMeasures,
  furtherMeasures,
  type FurtherMeasure,
  type MeasureKey,
} from '../body/card.ts';
import { handleKeys } from '../drafting/construction.ts';
import { levelNames, type LevelName } from '../drafting/piece.ts';
import { styleChoices } from '../drafts/gown/style-card.ts';
import type { BodiceBlockDraft } from '../engine/draft-bodice-block.ts';
import type { SkirtBlockDraft } from '../engine/draft-skirt-block.ts';
import type { Draft } from '../engine/draft.ts';
import type { Drafted } from '../engine/drafted.ts';
import {
  bodiceBlockCard,
  bodiceBlockStyle,
  skirtBlockCard,
  skirtBlockStyle,
} from './block-style.ts';
import { measureCard } from './card.ts';
import { pathSchema, pointSchema } from './geometry-reply.ts';
import { pieceSchema } from './piece-reply.ts';
import { problemSchema, saidSchema } from './problem.ts';
import { proofSchema } from './proof-reply.ts';
import { houseRules } from './rules.ts';
import { gownStyle, styleCard } from './style.ts';

/** `fromEntries` forgets the keys; they are those of the lists. */
const measures = () =>
  Object.fromEntries([...coreMeasures, ...furtherMeasures].map((key) => [key, z.number()])) as {
    [K in MeasureKey]: z.ZodNumber;
  };
const rulesUsed = () =>
  Object.fromEntries(furtherMeasures.map((key) => [key, z.exactOptional(z.string())])) as {
    [K in FurtherMeasure]: z.ZodExactOptional<z.ZodString>;
  };
const heights = () =>
  Object.fromEntries(levelNames.map((level) => [level, z.number()])) as {
    [L in LevelName]: z.ZodNumber;
  };

const someHeights = () =>
  Object.fromEntries(levelNames.map((level) => [level, z.exactOptional(z.number())])) as {
    [L in LevelName]: z.ZodExactOptional<z.ZodNumber>;
  };

const bodyLevels = z.object({
  sideNeckX: z.number(),
  bustPointX: z.number(),
  bust: z.number(),
  underbust: z.number(),
  underarm: z.number(),
  nape: z.number(),
  waist: z.number(),
  topHip: z.number(),
  hip: z.number(),
  knee: z.number(),
  floor: z.number(),
});

const step = z.object({
  id: z.string(),
  part: z.string(),
  title: z.string(),
  said: saidSchema,
  why: z.exactOptional(saidSchema),
  points: z.record(z.string(), pointSchema),
  lines: z.array(pathSchema),
  side: z.enum(['front', 'back', 'both', 'flare']),
  measures: z.array(z.string()),
  pieces: z.exactOptional(z.array(z.string())),
});

const edgeRef = z.object({ piece: z.string(), edge: z.string() });

const wanted = z.array(
  z.object({
    level: z.enum(levelNames),
    body: z.exactOptional(z.number()),
    ease: z.exactOptional(z.number()),
    wanted: z.number(),
    estimated: z.boolean(),
  }),
);

const construction = z.object({
  wanted,
  chestSide: z.object({ front: z.number(), back: z.number() }),
  topOpenings: z.array(
    z.object({
      side: z.enum(['front', 'back']),
      wanted: z.number(),
      height: z.number(),
      centre: edgeRef,
      outer: edgeRef,
    }),
  ),
  opening: z.object({
    closure: z.enum(styleChoices.closure),
    hips: z.number(),
    least: z.number(),
    give: z.number(),
    closedTop: z.exactOptional(z.number()),
  }),
  knees: z.object({ standing: z.number(), step: z.number(), caution: z.boolean() }),
  gaps: z.exactOptional(z.object(someHeights())),
  intakesGiven: z.exactOptional(z.boolean()),
});

const handle = z.object({
  key: z.enum(handleKeys),
  piece: z.string(),
  at: pointSchema,
  along: pointSchema,
  perMillimetre: z.number(),
});

const completed = z.object({
  measures: z.object(measures()),
  estimated: z.object(rulesUsed()),
});

/** What every draft tells, whatever its garment. */
const drafted = {
  engine: z.string(),
  number: z.string(),
  body: completed,
  bodyLevels,
  pieces: z.array(pieceSchema),
  steps: z.array(step),
  warnings: z.array(problemSchema),
  proof: proofSchema,
};

/** A gown drafted, finished and proven, as it goes over the wire and into `draft.json`. */
export const draftSchema = z.object({
  garment: z.literal('gown'),
  ...drafted,
  inputs: z.object({
    garment: z.literal('gown').optional(),
    card: measureCard,
    style: styleCard,
    rules: houseRules,
  }),
  style: gownStyle,
  levels: z.object(heights()),
  handles: z.array(handle),
  construction,
  walking: z.object({ step: z.number(), caution: z.boolean(), said: saidSchema }),
}) satisfies z.ZodType<Draft>;

const block = {
  ...drafted,
  levels: z.object(someHeights()),
  wanted,
  bustPoint: z.exactOptional(pointSchema),
};

/** A bodice block, as a gown's draft. */
const bodiceBlockDraft = z.object({
  garment: z.literal('bodice-block'),
  ...block,
  inputs: z.object({
    garment: z.literal('bodice-block'),
    card: measureCard,
    style: bodiceBlockCard,
    rules: houseRules,
  }),
  style: bodiceBlockStyle,
}) satisfies z.ZodType<BodiceBlockDraft>;

/** A skirt block, as a gown's draft. */
const skirtBlockDraft = z.object({
  garment: z.literal('skirt-block'),
  ...block,
  inputs: z.object({
    garment: z.literal('skirt-block'),
    card: measureCard,
    style: skirtBlockCard,
    rules: houseRules,
  }),
  style: skirtBlockStyle,
}) satisfies z.ZodType<SkirtBlockDraft>;

/** Whatever was drafted, told apart by its garment. */
export const draftedSchema = z.discriminatedUnion('garment', [
  draftSchema,
  bodiceBlockDraft,
  skirtBlockDraft,
]) satisfies z.ZodType<Drafted>;
