import { z } from 'zod';
import { problemSchema } from './problem.ts';

/** Every reason for which the server refuses a request; one place in the server knows their statuses. */
export const refusalCodes = [
  /** The body is no JSON. */
  'not-json',
  /** The body has a wrong shape, or a card, style or rule outside its bounds: see `problems`. */
  'bad-input',
  /** Within all bounds, and the gown still cannot be drawn: see `problems`. */
  'not-drawable',
  'not-found',
  'method-not-allowed',
  'wrong-media-type',
  'too-large',
  'too-many-requests',
  'busy',
  /** A bug: logged with its request number, no detail sent. */
  'internal',
] as const;
export type RefusalCode = (typeof refusalCodes)[number];

/** The body of every refusal. */
export const refusal = z.object({
  code: z.enum(refusalCodes),
  message: z.string(),
  problems: z.array(problemSchema).optional(),
});
export type Refusal = z.output<typeof refusal>;
