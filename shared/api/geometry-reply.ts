import { z } from 'zod';
import type { Line, Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';

export const pointSchema = z.object({
  x: z.number(),
  y: z.number(),
}) satisfies z.ZodType<Point>;

export const lineSchema = z.object({
  kind: z.literal('line'),
  from: pointSchema,
  to: pointSchema,
}) satisfies z.ZodType<Line>;

/** Lines and cubics laid end to end, millimetres. */
export const pathSchema = z.array(
  z.discriminatedUnion('kind', [
    lineSchema,
    z.object({
      kind: z.literal('cubic'),
      from: pointSchema,
      c1: pointSchema,
      c2: pointSchema,
      to: pointSchema,
    }),
  ]),
) satisfies z.ZodType<Path>;
