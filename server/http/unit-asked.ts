import type { Unit } from '#shared/units/said.ts';

/** The unit a person reads in, as far as an unread body tells it. */
export const unitAsked = (body: unknown): Unit =>
  typeof body === 'object' && body !== null && 'unit' in body && body.unit === 'in' ? 'in' : 'cm';
