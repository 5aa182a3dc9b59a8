import type { Body, MeasureKey } from '../../body/card.ts';
import { type EaseLevel, type StyleCard, easeLevels } from './style-card.ts';

/** Bounds of an ease and what it is when left open, whole-girth mm. */
type EaseLimit = { readonly min: number; readonly max: number; readonly initial: number };
type EaseLimits = { readonly [L in `ease.${EaseLevel}`]: EaseLimit };

/**
 * Ease the woven, boned gown takes at each level (method section 4), and how far a maker may go: a woven
 * skirt smaller than the hips could not be worn, nor put on.
 */
const woven: { readonly [L in EaseLevel]: EaseLimit } = {
  chest: { min: -60, max: 60, initial: -20 },
  bust: { min: -40, max: 100, initial: 0 },
  underbust: { min: -60, max: 80, initial: -15 },
  waist: { min: -60, max: 100, initial: -10 },
  topHip: { min: -40, max: 100, initial: 5 },
  hip: { min: 0, max: 120, initial: 20 },
};

const girths: { readonly [L in EaseLevel]: MeasureKey } = {
  chest: 'upperChestGirth',
  bust: 'bustGirth',
  underbust: 'underbustGirth',
  waist: 'waistGirth',
  topHip: 'topHipGirth',
  hip: 'hipGirth',
};

/** Stretch of a cloth where its card leaves it open, per cent. */
export const usualStretch = 20;

/** Part of its stretch a cloth is worn at, and at most (reference.md 3k, common practice: a third to half of it). */
const wornPart = 1 / 3;
const mostPart = 1 / 2;

/**
 * Ease of a girth in a cloth worn stretched, mm, less than nothing: the pattern is the body over 1 + S/100,
 * with the part of the stretch S, per cent, that is to be used.
 */
export const stretchedEase = (girth: number, stretch: number, part: number): number =>
  Math.round(girth / (1 + (part * stretch) / 100) - girth);

function limitAt(
  level: EaseLevel,
  body: Body,
  { cloth, stretch = usualStretch }: StyleCard,
): EaseLimit {
  const plain = woven[level];
  if (cloth !== 'stretch' || !Number.isFinite(stretch)) return plain;
  const girth = body.measures[girths[level]];
  return {
    min: Math.min(plain.min, stretchedEase(girth, stretch, mostPart)),
    max: plain.max,
    initial: Math.min(plain.initial, stretchedEase(girth, stretch, wornPart)),
  };
}

/** Bounds and initial value of the ease at every level, in the cloth of the style card; whole-girth mm. */
export const easeLimits = (body: Body, style: StyleCard): EaseLimits =>
  everyLevel(easeLevels.map((level) => [`ease.${level}`, limitAt(level, body, style)]));

/** `fromEntries` forgets the keys; they are those of the list. */
const everyLevel = (entries: readonly (readonly [string, EaseLimit])[]): EaseLimits =>
  Object.fromEntries(entries) as EaseLimits;
