import { z } from 'zod';
import { levelNames } from '../drafting/piece.ts';
import type { Proof } from '../proof/proof.ts';
import { pointSchema } from './geometry-reply.ts';
import { saidSchema } from './problem.ts';

const finding = z.object({
  holds: z.boolean(),
  reported: z.exactOptional(z.literal(true)),
  said: saidSchema,
  value: z.number(),
  expected: z.number(),
  bound: z.number(),
  where: z.array(
    z.object({
      piece: z.string(),
      edge: z.exactOptional(z.string()),
      at: z.exactOptional(pointSchema),
    }),
  ),
});

const walked = z.object({ piece: z.string(), edge: z.string(), length: z.number() });

/** The proof a draft carries, as it goes over the wire and into `proof.json`. */
export const proofSchema = z.object({
  holds: z.boolean(),
  verdict: saidSchema,
  lines: z.array(
    z.object({
      number: z.literal([1, 2, 3, 4, 5, 6, 7, 8]),
      title: z.string(),
      holds: z.boolean(),
      findings: z.array(finding),
    }),
  ),
  girths: z.array(
    z.object({
      level: z.enum(levelNames),
      body: z.exactOptional(z.number()),
      ease: z.exactOptional(z.number()),
      wanted: z.number(),
      pieces: z.number(),
      estimated: z.boolean(),
    }),
  ),
  seams: z.array(
    z.object({
      title: z.string(),
      first: walked,
      second: walked,
      ease: z.number(),
      holds: z.boolean(),
    }),
  ),
}) satisfies z.ZodType<Proof>;
