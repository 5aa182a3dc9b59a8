import { z } from 'zod';
import {
  coreMeasures,
  furtherMeasures,
  type FurtherMeasure,
  type MeasureKey,
} from '../body/card.ts';
import { handleKeys } from '../drafting/construction.ts';
import { levelNames, type LevelName } from '../drafting/piece.ts';
import type { Draft } from '../engine/draft.ts';
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

const construction = z.object({
  wanted: z.array(
    z.object({
      level: z.enum(levelNames),
      body: z.exactOptional(z.number()),
      ease: z.exactOptional(z.number()),
      wanted: z.number(),
      estimated: z.boolean(),
    }),
  ),
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
});

const handle = z.object({
  key: z.enum(handleKeys),
  piece: z.string(),
  at: pointSchema,
  along: pointSchema,
  perMillimetre: z.number(),
});

/** A gown drafted, finished and proven, as it goes over the wire and into `draft.json`. */
export const draftSchema = z.object({
  garment: z.literal('gown'),
  engine: z.string(),
  number: z.string(),
  inputs: z.object({
    garment: z.literal('gown').optional(),
    card: measureCard,
    style: styleCard,
    rules: houseRules,
  }),
  body: z.object({
    measures: z.object(measures()),
    estimated: z.object(rulesUsed()),
  }),
  bodyLevels,
  style: gownStyle,
  levels: z.object(heights()),
  pieces: z.array(pieceSchema),
  steps: z.array(step),
  handles: z.array(handle),
  construction,
  walking: z.object({ step: z.number(), caution: z.boolean(), said: saidSchema }),
  warnings: z.array(problemSchema),
  proof: proofSchema,
}) satisfies z.ZodType<Draft>;
