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

/** A finding that holds while the value is at least as much as asked, or less by the bound. */
export const atLeast = (
  value: number,
  least: number,
  bound: number,
  said: Said,
  where: readonly Place[],
): Finding => ({ holds: value >= least - bound, said, value, expected: least, bound, where });

/** A finding that holds while the value is at most as much as asked. */
export const atMost = (
  value: number,
  most: number,
  said: Said,
  where: readonly Place[],
): Finding => ({ holds: value <= most, said, value, expected: most, bound: 0, where });

/** Something measured for the maker to know and compared with nothing: it can neither hold nor fail. */
export const reported = (value: number, said: Said, where: readonly Place[]): Finding => ({
  holds: true,
  reported: true,
  said,
  value,
  expected: value,
  bound: 0,
  where,
});

/** A finding about something that is not there to be measured. */
export const missing = (said: Said, where: readonly Place[]): Finding => ({
  holds: false,
  said,
  value: 0,
  expected: 1,
  bound: 0,
  where,
});

/** A line of the proof: it holds when every finding does, and something was compared. */
export const proofLine = (
  number: ProofLine['number'],
  title: string,
  findings: readonly Finding[],
): ProofLine => ({
  number,
  title,
  holds: findings.some((each) => each.reported !== true) && findings.every((each) => each.holds),
  findings,
});
