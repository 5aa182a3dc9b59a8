import { z } from 'zod';
import { coreMeasures, furtherMeasures, type MeasureKey } from '../body/card.ts';
import { alignPoints, type Alignment } from '../compare/alignment.ts';
import { type GradeRules, mostSizes } from '../regrade/grade-rules.ts';
import type { NestOrder } from '../regrade/nest.ts';
import { endpoint } from './endpoint.ts';
import { keptText } from './kept-text.ts';
import { draftRequest } from './requests.ts';

/** What two drafts or the sizes of a nest are laid together on. */
const alignment = z.discriminatedUnion('on', [
  z.strictObject({ on: z.literal('point'), point: z.enum(alignPoints) }),
  z.strictObject({ on: z.literal('seam'), edge: z.string().max(60) }),
]) satisfies z.ZodType<Alignment>;

const paper = {
  align: alignment.prefault({ on: 'point', point: 'centre-waist' }),
  unit: z.enum(['cm', 'in']),
  paper: z.enum(['A4', 'Letter']),
  /** True scale, on sheets to glue, or a quarter of it. */
  scale: z.union([z.literal(1), z.literal(0.25)]),
};

const name = keptText(60).pipe(z.string().min(1));

/** Two drafts to be printed over each other, and what each is called. */
export const compareRequest = z.strictObject({
  first: draftRequest,
  second: draftRequest,
  names: z.strictObject({ first: name, second: name }),
  ...paper,
});
export type CompareRequest = z.output<typeof compareRequest>;

type Steps = { [K in MeasureKey]: z.ZodOptional<z.ZodNumber> };

/** `fromEntries` forgets the keys; they are those of the two lists. */
const steps = () =>
  Object.fromEntries(
    [...coreMeasures, ...furtherMeasures].map((key) => [key, z.number().optional()]),
  ) as Steps;

const depth = z.exactOptional(z.enum(['fixed', 'proportional']));

const sizes = z.int().min(0).max(mostSizes);

/** A nest: grade rules in mm a step, sizes either way, and what becomes of the depths. */
export const nestOrder = z.strictObject({
  rules: z.strictObject(steps()) satisfies z.ZodType<GradeRules>,
  smaller: sizes,
  larger: sizes,
  depths: z.strictObject({
    topDrop: depth,
    neckDepth: depth,
    sideDepth: depth,
    backDepth: depth,
  }),
}) satisfies z.ZodType<NestOrder>;

export const nestRequest = z.strictObject({
  inputs: draftRequest,
  nest: nestOrder,
  lines: z.enum(['finished', 'cutting']),
  ...paper,
});
export type NestRequest = z.output<typeof nestRequest>;

const pdf = { kind: 'file', mediaType: 'application/pdf' } as const;
const svg = { kind: 'file', mediaType: 'image/svg+xml' } as const;

/** Two drafts over each other: what the lines are, the figures, and the pieces on sheets. */
export const printComparison = endpoint({
  method: 'POST',
  path: '/api/prints/compare',
  body: compareRequest,
  reply: pdf,
});

export const printComparisonSvg = endpoint({
  method: 'POST',
  path: '/api/prints/compare.svg',
  body: compareRequest,
  reply: svg,
});

/** A nest of sizes, each in a layer of its own. */
export const printNest = endpoint({
  method: 'POST',
  path: '/api/prints/nest',
  body: nestRequest,
  reply: pdf,
});

export const printNestSvg = endpoint({
  method: 'POST',
  path: '/api/prints/nest.svg',
  body: nestRequest,
  reply: svg,
});
