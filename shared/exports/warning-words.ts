import type { Problem } from '../units/problem.ts';
import type { Unit } from '../units/said.ts';
import { speak } from '../units/speak.ts';

/** A warning as it is printed, with the maker's reason where she has overruled it. */
export const warningWords = ({ said, overruled }: Problem, unit: Unit): string =>
  overruled === undefined
    ? speak(said, unit)
    : `${speak(said, unit)} Overruled by the maker: ${overruled}`;
