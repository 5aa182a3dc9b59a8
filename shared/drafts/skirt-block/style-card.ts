import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { type LengthChoice, checkChoice } from '../../drafting/choices.ts';
import { isQuarterRule } from '../../drafting/house-rule-presets.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Problem } from '../../units/problem.ts';

/** Style card of a skirt block, millimetres. What is left out takes its initial value. */
export type SkirtBlockCard = {
  /** Wearing ease round the whole body. */
  readonly ease?:
    { readonly waist?: number | undefined; readonly hip?: number | undefined } | undefined;
  /** How much wider the back is than the front at the hip, on each side. */
  readonly seat?: number | undefined;
  /** From the waist to the hem. */
  readonly length?: number | undefined;
};

/** A style card with every choice made. */
export type SkirtBlockStyle = {
  readonly ease: { readonly waist: number; readonly hip: number };
  readonly seat: number;
  readonly length: number;
};

export const skirtLengthKeys = ['ease.waist', 'ease.hip', 'seat', 'length'] as const;
export type SkirtLength = (typeof skirtLengthKeys)[number];

/**
 * The back hip of a skirt is 15 wider than the front's where hip less waist is 260: PP, 2018 (seen), on hip
 * 940 and waist 680. By that proportion, at most 20, the seat's fullness and its darts lie behind (our rule).
 */
const seatOf = (hip: number, waist: number): number =>
  Math.min(20, Math.max(0, ((hip - waist) * 15) / 260));

/** A straight skirt runs on at least this far under the hip, and its hem stays this far off the floor (our rule). */
const leastUnderHip = 80;
const leastOffFloor = 20;

/** What each length is called, and one sentence beside it. */
export const skirtLengthWords: {
  readonly [K in SkirtLength]: { readonly label: string; readonly hint: string };
} = {
  'ease.waist': {
    label: 'Ease at the waist',
    hint: 'Room in the waistband, round the whole body.',
  },
  'ease.hip': { label: 'Ease at the hip', hint: 'Room to sit and step, round the whole body.' },
  seat: {
    label: 'Seat',
    hint: 'How much wider the back is than the front at the hip; its darts take that much more.',
  },
  length: { label: 'Skirt length', hint: 'From the waist down to the hem.' },
};

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
      ...skirtLengthWords['ease.waist'],
      min: 0,
      max: 60,
      initial: 10,
    },
    'ease.hip': {
      ...skirtLengthWords['ease.hip'],
      min: 10,
      max: 120,
      initial: 30,
    },
    seat: {
      ...skirtLengthWords.seat,
      min: 0,
      max: 30,
      initial: seatOf(measures.hipGirth, measures.waistGirth),
    },
    length: {
      ...skirtLengthWords.length,
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
    ...checkChoice('style.seat', card.seat, lengths.seat),
    ...checkChoice('style.length', card.length, lengths.length),
  ];
}

/** Makes every choice the card leaves open; the plain quarter rule has no seat of its own. */
export function resolveSkirtBlock(
  card: SkirtBlockCard,
  body: Body,
  levels: BodyLevels,
  rules: HouseRules,
): SkirtBlockStyle {
  const lengths = skirtBlockLengths(body, levels);
  return {
    ease: {
      waist: card.ease?.waist ?? lengths['ease.waist'].initial,
      hip: card.ease?.hip ?? lengths['ease.hip'].initial,
    },
    seat: card.seat ?? (isQuarterRule(rules) ? 0 : lengths.seat.initial),
    length: card.length ?? lengths.length.initial,
  };
}
