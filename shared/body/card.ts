/** Keys of the ten core measures, in the order a tape is passed (method section 2). */
export const coreMeasures = [
  'bustGirth',
  'underbustGirth',
  'waistGirth',
  'hipGirth',
  'bustSpan',
  'sideNeckToBustPoint',
  'sideNeckToUnderbust',
  'frontWaistLength',
  'waistToHip',
  'waistToFloor',
] as const;

/** Keys of the measures that are estimated when nobody has taken them. */
export const furtherMeasures = [
  'upperChestGirth',
  'backWaistLength',
  'armscyeDepth',
  'shoulderLength',
  'shoulderWidth',
  'acrossBack',
  'acrossFront',
  'waistToKnee',
  'waistSeamGirth',
  'neckGirth',
  'shoulderSlope',
  'topHipGirth',
  'waistToTopHip',
  'kneeGirth',
  'bothKneesGirth',
  'upperArmGirth',
  'shoulderGirth',
  'underarmToWaist',
  'armLength',
  'wristGirth',
  'height',
] as const;

export type CoreMeasure = (typeof coreMeasures)[number];
export type FurtherMeasure = (typeof furtherMeasures)[number];
export type MeasureKey = CoreMeasure | FurtherMeasure;

/** A warning about this card that the maker has looked at and keeps, and why; told by its code and fields. */
export type Overruled = {
  readonly code: string;
  readonly field: string;
  readonly with?: readonly string[] | undefined;
  readonly reason: string;
};

/** What was measured, millimetres (`shoulderSlope` degrees), and whose card it is. */
export type MeasureCard = {
  readonly name?: string | undefined;
  /** Day the measures were taken, `2026-11-14`. */
  readonly date?: string | undefined;
  readonly overruled?: readonly Overruled[] | undefined;
} & { readonly [K in CoreMeasure]: number } & {
  readonly [K in FurtherMeasure]?: number | undefined;
};

/** A card completed: every measure has a value, and the estimated ones say by which rule. */
export type Body = {
  readonly measures: { readonly [K in MeasureKey]: number };
  /** Name of the estimating rule for each measure that nobody took. */
  readonly estimated: { readonly [K in FurtherMeasure]?: string };
};
