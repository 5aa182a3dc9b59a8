/** The levels at which the style card gives ease. */
export const easeLevels = ['chest', 'bust', 'underbust', 'waist', 'topHip', 'hip'] as const;
export type EaseLevel = (typeof easeLevels)[number];

/** Shapes of the front's top line. */
export const topLineShapes = ['sweetheart', 'straight', 'scooped', 'notched'] as const;
export type TopLineShape = (typeof topLineShapes)[number];

/**
 * The choices of a style card by name, the first of each being what a card left open means
 * (method section 6). With a sleeve band the gown is off the shoulder, without one strapless.
 */
export const styleChoices = {
  topLine: topLineShapes,
  shaping: ['princess', 'darts'],
  waistSeam: ['raised', 'natural', 'none'],
  flare: ['circle', 'aLine', 'godets', 'integral'],
  sleeve: ['none', 'plainBand', 'pleatedBand'],
  closure: ['centreBackZip', 'sideZip', 'laced'],
  facing: ['none', 'faced'],
  lining: ['none', 'lined'],
  boning: ['none', 'boned'],
  cloth: ['woven', 'stretch'],
} as const;
export type StyleChoices = typeof styleChoices;
export type StyleChoice = keyof StyleChoices;

/**
 * Style card of a gown (method section 6), millimetres. What is left out takes its default, which
 * may hang on the body (`resolveStyle`).
 */
export type StyleCard = { readonly [C in StyleChoice]?: StyleChoices[C][number] | undefined } & {
  readonly topDrop?: number | undefined;
  readonly neckDepth?: number | undefined;
  readonly neckWidth?: number | undefined;
  readonly sideDepth?: number | undefined;
  readonly backDepth?: number | undefined;
  /** How far a raised waist seam lies above the waist. */
  readonly waistSeamRise?: number | undefined;
  readonly dartLength?: number | undefined;
  readonly kneeLevel?: number | undefined;
  readonly kneeFinished?: number | undefined;
  /** Part of a full circle in the whole flare: 0.5 is a half circle. */
  readonly flareFraction?: number | undefined;
  /** Girth of the hem, for every flare but the circle, whose fraction gives it. */
  readonly hemSweep?: number | undefined;
  /** Knee seam to hem; left out, the flare reaches `floorClearance` above the floor in shoes. */
  readonly flareLength?: number | undefined;
  readonly floorClearance?: number | undefined;
  readonly heelHeight?: number | undefined;
  /** What the hem at the centre back is longer by, lying on the floor behind. */
  readonly train?: number | undefined;
  /** Finished depth of the sleeve band. */
  readonly bandHeight?: number | undefined;
  /** Cloth of a pleated band over its finished length. */
  readonly pleatRatio?: number | undefined;
  /** Room between the arms and the band, on the girth round both. */
  readonly armEase?: number | undefined;
  /** Per cent the cloth stretches round the body, measured on a 100 mm sample. */
  readonly stretch?: number | undefined;
  /** Per cent the cloth loses in its first wash or press. */
  readonly shrinkage?: number | undefined;
  /** Usable width of the cloth: wider flare panels are divided by further seams. */
  readonly clothWidth?: number | undefined;
  /** Whole-girth ease by level; may be negative. */
  readonly ease?: { readonly [L in EaseLevel]?: number | undefined } | undefined;
};

/** Keys of the style card that hold one length, or one of the `plainNumbers`. */
export const styleLengths = [
  'topDrop',
  'neckDepth',
  'neckWidth',
  'sideDepth',
  'backDepth',
  'waistSeamRise',
  'dartLength',
  'kneeLevel',
  'kneeFinished',
  'flareFraction',
  'flareLength',
  'floorClearance',
  'hemSweep',
  'heelHeight',
  'train',
  'bandHeight',
  'pleatRatio',
  'armEase',
  'stretch',
  'shrinkage',
  'clothWidth',
] as const;
export type StyleLength = (typeof styleLengths)[number];

/** Those of the lengths that are no lengths: parts of a circle, ratios and per cents. */
export const plainNumbers = ['flareFraction', 'pleatRatio', 'stretch', 'shrinkage'] as const;
export const isPlainNumber = (key: string): boolean => plainNumbers.some((plain) => plain === key);

/** A style card with every choice made. */
export type GownStyle = { readonly [K in StyleLength]: number } & {
  readonly [C in StyleChoice]: StyleChoices[C][number];
} & {
  readonly ease: { readonly [L in EaseLevel]: number };
};

/** Whether the gown hangs off the shoulder: it does where bands hold it. */
export const isOffShoulder = (style: Pick<StyleCard, 'sleeve'>): boolean =>
  style.sleeve !== undefined && style.sleeve !== 'none';
