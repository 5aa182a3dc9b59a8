import { z } from 'zod';
import type { Problem } from '../units/problem.ts';
import type { Said } from '../units/said.ts';

/** A sentence with its quantities open. */
export const saidSchema = z.array(
  z.union([
    z.string(),
    z.strictObject({
      mm: z.number(),
      fine: z.exactOptional(z.literal(true)),
      of: z.exactOptional(z.array(z.string())),
    }),
    z.strictObject({ deg: z.number(), of: z.exactOptional(z.array(z.string())) }),
  ]),
) satisfies z.ZodType<Said>;

/** Something a person can act on, as it goes over the wire. */
export const problemSchema = z.strictObject({
  code: z.string(),
  severity: z.enum(['error', 'warning']),
  field: z.string(),
  with: z.exactOptional(z.array(z.string())),
  said: saidSchema,
  overruled: z.exactOptional(z.string()),
}) satisfies z.ZodType<Problem>;
