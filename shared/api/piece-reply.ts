import { z } from 'zod';
import { edgeKinds } from '../drafting/house-rules.ts';
import { levelNames, type FinishedPiece } from '../drafting/piece.ts';
import { lineSchema, pathSchema, pointSchema } from './geometry-reply.ts';

const edge = z.object({
  name: z.string(),
  path: pathSchema,
  kind: z.enum(edgeKinds),
  joins: z.exactOptional(
    z.union([z.literal('self'), z.object({ piece: z.string(), edge: z.string() })]),
  ),
  ease: z.exactOptional(z.number()),
  easeBetween: z.exactOptional(z.tuple([z.string(), z.string()])),
  ratio: z.exactOptional(z.number()),
  corner: z.exactOptional(z.number()),
  open: z.exactOptional(z.boolean()),
  narrow: z.exactOptional(z.boolean()),
});

const dart = z.object({
  name: z.string(),
  tip: z.enum(['above', 'below', 'both']),
  centreLeg: pathSchema,
  sideLeg: pathSchema,
  mouth: z.exactOptional(z.string()),
  pressed: z.enum(['centre', 'side', 'down']),
});

const notch = z.object({
  name: z.string(),
  edge: z.string(),
  at: pointSchema,
  outward: pointSchema,
  strokes: z.union([z.literal(1), z.literal(2)]),
});

const innerLine = z.object({
  name: z.string(),
  kind: z.enum(['boning', 'pleat-fold', 'pleat-place', 'stay', 'stitching']),
  path: pathSchema,
});

/** A piece with everything the scissors need, as it goes over the wire and into `draft.json`. */
export const pieceSchema = z.object({
  name: z.string(),
  title: z.string(),
  side: z.enum(['front', 'back']),
  part: z.enum(['top', 'middle', 'flare', 'sleeve', 'inner']),
  cloth: z.exactOptional(z.enum(['lining', 'interfacing', 'ribbon'])),
  cut: z.string(),
  copies: z.number(),
  edges: z.array(edge),
  darts: z.array(dart),
  levels: z.array(z.object({ level: z.enum(levelNames), from: pointSchema, to: pointSchema })),
  notches: z.array(notch),
  grain: z.object({ from: pointSchema, to: pointSchema }),
  drills: z.array(pointSchema),
  lines: z.exactOptional(z.array(innerLine)),
  cutLine: pathSchema,
  notchMarks: z.array(
    z.object({ name: z.string(), edge: z.string(), strokes: z.array(lineSchema) }),
  ),
  lettering: z.array(z.object({ text: z.string(), at: pointSchema, size: z.number() })),
}) satisfies z.ZodType<FinishedPiece>;
