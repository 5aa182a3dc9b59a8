import { type LengthChoice, checkChoice, checkName } from '../../drafting/choices.ts';
import type { Problem } from '../../units/problem.ts';

/** Rules for the angle of the bust dart (`bust-dart.ts`). */
export const bustDartRules = ['cup', 'shoulderTable', 'proportional', 'lengths'] as const;
export type BustDartRule = (typeof bustDartRules)[number];

/** Seams the bust dart may be sewn into. */
export const dartPlaces = ['shoulder', 'armhole', 'side', 'waist', 'neck', 'topLine'] as const;
export type BustDartPlace = (typeof dartPlaces)[number];

/** Style card of a bodice block, millimetres. What is left out takes its initial value. */
export type BodiceBlockCard = {
  /** Wearing ease round the whole body. */
  readonly ease?:
    { readonly bust?: number | undefined; readonly waist?: number | undefined } | undefined;
  readonly armholeDrop?: number | undefined;
  readonly shoulderEase?: number | undefined;
  readonly bustDartRule?: BustDartRule | undefined;
  readonly bustDart?: BustDartPlace | undefined;
};

/** A style card with every choice made. */
export type BodiceBlockStyle = {
  readonly ease: { readonly bust: number; readonly waist: number };
  readonly armholeDrop: number;
  readonly shoulderEase: number;
  readonly bustDartRule: BustDartRule;
  readonly bustDart: BustDartPlace;
};

/**
 * Bounds and initial values of the lengths. Ease at the bust: the least a woven bodice is worn with, one
 * teacher (seen), and the lower end of ready-to-wear, 50 to 64 (seen). Ease at the waist: between that
 * teacher's 20 (seen) and Aldrich's 60 (from memory). Armhole and shoulder ease: common practice, no
 * source; back shoulder 5 to 10.
 */
export const bodiceBlockLengths = {
  'ease.bust': {
    label: 'Ease at the bust',
    hint: 'Room to move, round the whole body.',
    min: 20,
    max: 160,
    initial: 60,
  },
  'ease.waist': {
    label: 'Ease at the waist',
    hint: 'Room to breathe and sit, round the whole body.',
    min: 0,
    max: 160,
    initial: 40,
  },
  armholeDrop: {
    label: 'Armhole drop',
    hint: 'How far the armhole lies below the armpit.',
    min: 0,
    max: 40,
    initial: 20,
  },
  shoulderEase: {
    label: 'Ease of the back shoulder',
    hint: 'How much longer the back shoulder is, for the roundness of the blade.',
    min: 0,
    max: 10,
    initial: 5,
  },
} as const satisfies Readonly<Record<string, LengthChoice>>;

/** The trade's words for the choices among names, as the style card shows them. */
export const bodiceBlockLabels = {
  bustDartRule: 'Rule for the bust dart',
  bustDart: 'Bust dart in',
} as const;

/** What is wrong in a style card, in its own order. Whether the body can wear it is the draft's to say. */
export const checkBodiceBlock = (card: BodiceBlockCard): readonly Problem[] => [
  ...checkChoice('style.ease.bust', card.ease?.bust, bodiceBlockLengths['ease.bust']),
  ...checkChoice('style.ease.waist', card.ease?.waist, bodiceBlockLengths['ease.waist']),
  ...checkChoice('style.armholeDrop', card.armholeDrop, bodiceBlockLengths.armholeDrop),
  ...checkChoice('style.shoulderEase', card.shoulderEase, bodiceBlockLengths.shoulderEase),
  ...checkName(
    'style.bustDartRule',
    bodiceBlockLabels.bustDartRule,
    card.bustDartRule,
    bustDartRules,
  ),
  ...checkName('style.bustDart', bodiceBlockLabels.bustDart, card.bustDart, dartPlaces),
];

/** Makes every choice the card leaves open. */
export const resolveBodiceBlock = (card: BodiceBlockCard): BodiceBlockStyle => ({
  ease: {
    bust: card.ease?.bust ?? bodiceBlockLengths['ease.bust'].initial,
    waist: card.ease?.waist ?? bodiceBlockLengths['ease.waist'].initial,
  },
  armholeDrop: card.armholeDrop ?? bodiceBlockLengths.armholeDrop.initial,
  shoulderEase: card.shoulderEase ?? bodiceBlockLengths.shoulderEase.initial,
  bustDartRule: card.bustDartRule ?? 'cup',
  bustDart: card.bustDart ?? 'shoulder',
});
