import type { Said } from '../units/said.ts';
import type { Finding, ProofLine } from './proof.ts';

type Place = Finding['where'][number];

/** A finding that holds while the value lies within the bound of what was expected. */
export const finding = (
  value: number,
  expected: number,
  bound: number,
  said: Said,
  where: readonly Place[],
): Finding => ({ holds: Math.abs(value - expected) <= bound, said, value, expected, bound, where });

/** A finding about something that is not there to be measured. */
export const missing = (said: Said, where: readonly Place[]): Finding => ({
  holds: false,
  said,
  value: 0,
  expected: 1,
  bound: 0,
  where,
});

/** A line of the proof: it holds when every finding does, and something was looked at. */
export const proofLine = (
  number: ProofLine['number'],
  title: string,
  findings: readonly Finding[],
): ProofLine => ({
  number,
  title,
  holds: findings.length > 0 && findings.every((each) => each.holds),
  findings,
});
