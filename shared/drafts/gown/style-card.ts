/** The levels at which the style card gives ease. */
export const easeLevels = ['chest', 'bust', 'underbust', 'waist', 'topHip', 'hip'] as const;
export type EaseLevel = (typeof easeLevels)[number];

/** Shapes of the front's top line. */
export const topLineShapes = ['sweetheart', 'straight', 'scooped', 'notched'] as const;
export type TopLineShape = (typeof topLineShapes)[number];

/**
 * Style card of a gown (method section 6), millimetres. What is left out takes its default, which
 * may hang on the body (`resolveStyle`).
 */
export type StyleCard = {
  readonly topLine?: TopLineShape | undefined;
  readonly topDrop?: number | undefined;
  readonly neckDepth?: number | undefined;
  readonly neckWidth?: number | undefined;
  readonly sideDepth?: number | undefined;
  readonly backDepth?: number | undefined;
  readonly shaping?: 'princess' | 'darts' | undefined;
  readonly dartLength?: number | undefined;
  readonly kneeLevel?: number | undefined;
  readonly kneeFinished?: number | undefined;
  /** Part of a full circle in the whole flare: 0.5 is a half circle. */
  readonly flareFraction?: number | undefined;
  /** Knee seam to hem; left out, the flare reaches `floorClearance` above the floor in shoes. */
  readonly flareLength?: number | undefined;
  readonly floorClearance?: number | undefined;
  readonly heelHeight?: number | undefined;
  /** Usable width of the cloth: wider flare panels are divided by further seams. */
  readonly clothWidth?: number | undefined;
  /** Whole-girth ease by level; may be negative. */
  readonly ease?: { readonly [L in EaseLevel]?: number | undefined } | undefined;
};

/** Keys of the style card that hold one length (or the flare's fraction). */
export const styleLengths = [
  'topDrop',
  'neckDepth',
  'neckWidth',
  'sideDepth',
  'backDepth',
  'dartLength',
  'kneeLevel',
  'kneeFinished',
  'flareFraction',
  'flareLength',
  'floorClearance',
  'heelHeight',
  'clothWidth',
] as const;
export type StyleLength = (typeof styleLengths)[number];

/** A style card with every choice made. */
export type GownStyle = { readonly [K in StyleLength]: number } & {
  readonly topLine: TopLineShape;
  readonly shaping: 'princess' | 'darts';
  readonly ease: { readonly [L in EaseLevel]: number };
};
