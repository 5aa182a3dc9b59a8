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
  /** Nobody is signed in, or the session has ended. */
  'not-signed-in',
  /** E-mail and password do not belong together; whether there is such an account is not said. */
  'wrong-sign-in',
  /** The request was sent from a page of somebody else's. */
  'wrong-origin',
  'not-found',
  /** The account keeps as many of these as it may. */
  'account-full',
  /** The measure card was laid on a gown: its measures stay as they are. */
  'card-in-use',
  /** The gown is made, or keeps revisions, for somebody else than the measure card is. */
  'another-person',
  /** Saved meanwhile from somewhere else: `current` is how it now stands. */
  'conflict',
  /** This page and the server draw by different rules: open the page again. */
  'engine-changed',
  'method-not-allowed',
  'wrong-media-type',
  'too-large',
  /** A file was asked for in a range, or on a condition, that it does not meet. */
  'no-such-range',
  'precondition-failed',
  'too-many-requests',
  'busy',
  /** The database does not answer for the moment: send the same again. */
  'unavailable',
  /** A bug: logged with its request number, no detail sent. */
  'internal',
] as const;
export type RefusalCode = (typeof refusalCodes)[number];

/** The body of every refusal. */
export const refusal = z.object({
  code: z.enum(refusalCodes),
  message: z.string(),
  problems: z.array(problemSchema).optional(),
  /** With `conflict`: the record as the server has it, in the shape its reading endpoint replies. */
  current: z.unknown().optional(),
});
export type Refusal = z.output<typeof refusal>;
