import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { type LengthChoice, checkChoice } from '../../drafting/choices.ts';
import type { Problem } from '../../units/problem.ts';

/** Style card of a skirt block, millimetres. What is left out takes its initial value. */
export type SkirtBlockCard = {
  /** Wearing ease round the whole body. */
  readonly ease?:
    { readonly waist?: number | undefined; readonly hip?: number | undefined } | undefined;
  /** From the waist to the hem. */
  readonly length?: number | undefined;
};

/** A style card with every choice made. */
export type SkirtBlockStyle = {
  readonly ease: { readonly waist: number; readonly hip: number };
  readonly length: number;
};

type SkirtLength = 'ease.waist' | 'ease.hip' | 'length';

/** A straight skirt runs on at least this far under the hip, and its hem stays this far off the floor (our rule). */
const leastUnderHip = 80;
const leastOffFloor = 20;

/**
 * Bounds and initial values on this body. Ease 10 at the waist and 30 at the hip: Aldrich's straight skirt
 * (from memory); the length is to the middle of the knee (common practice, no source).
 */
export function skirtBlockLengths(
  { measures }: Body,
  levels: BodyLevels,
): { readonly [K in SkirtLength]: LengthChoice } {
  const least = measures.waistToHip + leastUnderHip;
  const most = levels.floor - levels.waist - leastOffFloor;
  return {
    'ease.waist': {
      label: 'Ease at the waist',
      hint: 'Room in the waistband, round the whole body.',
      min: 0,
      max: 60,
      initial: 10,
    },
    'ease.hip': {
      label: 'Ease at the hip',
      hint: 'Room to sit and step, round the whole body.',
      min: 10,
      max: 120,
      initial: 30,
    },
    length: {
      label: 'Skirt length',
      hint: 'From the waist down to the hem.',
      min: least,
      max: most,
      initial: Math.min(most, Math.max(least, measures.waistToKnee)),
      with: ['card.waistToHip', 'card.waistToFloor'],
    },
  };
}

/** What is wrong in a style card on this body, in its own order. */
export function checkSkirtBlock(
  card: SkirtBlockCard,
  body: Body,
  levels: BodyLevels,
): readonly Problem[] {
  const lengths = skirtBlockLengths(body, levels);
  return [
    ...checkChoice('style.ease.waist', card.ease?.waist, lengths['ease.waist']),
    ...checkChoice('style.ease.hip', card.ease?.hip, lengths['ease.hip']),
    ...checkChoice('style.length', card.length, lengths.length),
  ];
}

/** Makes every choice the card leaves open. */
export function resolveSkirtBlock(
  card: SkirtBlockCard,
  body: Body,
  levels: BodyLevels,
): SkirtBlockStyle {
  const lengths = skirtBlockLengths(body, levels);
  return {
    ease: {
      waist: card.ease?.waist ?? lengths['ease.waist'].initial,
      hip: card.ease?.hip ?? lengths['ease.hip'].initial,
    },
    length: card.length ?? lengths.length.initial,
  };
}
