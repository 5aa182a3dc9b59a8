import { readingGrace } from '../units/format-length.ts';
import { type Problem, error } from '../units/problem.ts';
import { mm, said } from '../units/said.ts';

/** A length that a style card may leave open: how it is called, its bounds and what it is then, mm. */
export type LengthChoice = {
  readonly label: string;
  /** One sentence beside the field. */
  readonly hint: string;
  readonly min: number;
  readonly max: number;
  readonly initial: number;
  /** Fields its bounds hang on. */
  readonly with?: readonly string[];
};

/** What is wrong with one length of a style card; nothing where it was left open. */
export function checkChoice(
  field: string,
  value: number | undefined,
  { label, min, max, with: others }: LengthChoice,
): readonly Problem[] {
  if (value === undefined) return [];
  if (!Number.isFinite(value)) {
    return [
      error({
        code: 'not-a-number',
        field,
        said: said`${label} is not a number: type it again, or leave it open.`,
      }),
    ];
  }
  if (value >= min - readingGrace && value <= max + readingGrace) return [];
  return [
    error({
      code: 'out-of-range',
      field,
      ...(others && { with: others }),
      said: said`${label} ${mm(value)} must lie between ${mm(min)} and ${mm(max)} on this body: change it, or leave it open.`,
    }),
  ];
}

/** What is wrong with a choice among names; nothing where it was left open. */
export function checkName(
  field: string,
  label: string,
  value: string | undefined,
  names: readonly string[],
): readonly Problem[] {
  if (value === undefined || names.includes(value)) return [];
  return [
    error({
      code: 'not-a-choice',
      field,
      said: said`${label} must be one of ${names.join(', ')}: choose one, or leave it open.`,
    }),
  ];
}
