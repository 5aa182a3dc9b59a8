import type { Problem } from '#shared/units/problem.ts';

/** Why the server does not do what was asked; one place knows their HTTP statuses. */
export type RefusalCode =
  'malformed' | 'not-found' | 'too-large' | 'cannot-be-drafted' | 'too-many' | 'busy' | 'fault';

export const statusOf: { readonly [C in RefusalCode]: number } = {
  malformed: 400,
  'not-found': 404,
  'too-large': 413,
  'cannot-be-drafted': 422,
  'too-many': 429,
  busy: 503,
  fault: 500,
};

/** A refusal a person can act on; `problems` name the fields where there are any. */
export class RefusalError extends Error {
  constructor(
    readonly code: RefusalCode,
    message: string,
    readonly problems: readonly Problem[] = [],
    readonly retryAfterSeconds?: number,
  ) {
    super(message);
    this.name = 'RefusalError';
  }
}
