import type { RefusalCode } from '#shared/api/problem-codes.ts';
import type { Problem } from '#shared/units/problem.ts';
import { speak } from '#shared/units/speak.ts';
import type { Unit } from '#shared/units/said.ts';

/** The one place that knows HTTP statuses. */
export const statusOf: { readonly [C in RefusalCode]: number } = {
  'not-json': 400,
  'not-signed-in': 401,
  'wrong-sign-in': 401,
  'wrong-origin': 403,
  'not-found': 404,
  'method-not-allowed': 405,
  'account-full': 409,
  'another-person': 409,
  'card-in-use': 409,
  conflict: 409,
  'engine-changed': 409,
  'precondition-failed': 412,
  'too-large': 413,
  'wrong-media-type': 415,
  'no-such-range': 416,
  'bad-input': 422,
  'not-drawable': 422,
  'too-many-requests': 429,
  internal: 500,
  busy: 503,
  unavailable: 503,
};

/** What goes with a refusal, where it has any. */
type Details = {
  /** Which fields to change, and how. */
  readonly problems?: readonly Problem[];
  readonly retryAfterSeconds?: number;
  /** Methods the address does answer. */
  readonly allow?: string;
  /** The record as it stands, where somebody else saved it meanwhile. */
  readonly current?: unknown;
};

/** A refusal a person can act on. */
export class RefusalError extends Error {
  constructor(
    readonly code: RefusalCode,
    message: string,
    readonly details: Details = {},
  ) {
    super(message);
    this.name = 'RefusalError';
  }
}

/** A refusal for its problems' sake; its message is their sentences. */
export const refusalFor = (
  code: 'bad-input' | 'not-drawable',
  problems: readonly Problem[],
  unit: Unit,
): RefusalError =>
  new RefusalError(code, problems.map((each) => speak(each.said, unit)).join(' '), { problems });
