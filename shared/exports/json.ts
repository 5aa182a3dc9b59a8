import type { Drafted } from '../engine/drafted.ts';

/** Numbers to a thousandth of a millimetre (or degree), so that the file is the same everywhere. */
const rounded = (_key: string, value: unknown): unknown =>
  typeof value === 'number' ? Math.round(value * 1000) / 1000 + 0 : value;

const written = (value: unknown): string => `${JSON.stringify(value, rounded, 2)}\n`;

/** A draft as JSON by the contract of the README: inputs, levels, pieces, steps and proof; mm. */
export const draftJson = (draft: Drafted): string => written(draft);

/** The proof of a draft alone, as JSON. */
export const proofJson = (draft: Drafted): string => written(draft.proof);
