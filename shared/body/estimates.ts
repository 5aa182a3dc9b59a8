import type { CoreMeasure, FurtherMeasure } from './card.ts';

/**
 * Rules for the measures nobody took; all lengths in millimetres. Straight-line fits to published tables
 * (reference.md sections 1 and 2), worked out here: the tables themselves are not shipped. `ASTM D5585-95` figures
 * are from memory. Each name is shown to the maker beside the estimate.
 */
type Known = { readonly [K in CoreMeasure]: number } & {
  readonly [K in FurtherMeasure]?: number | undefined;
};

/** An estimate: how it is called on the card, and the value from what is known by then. */
type Estimate<K extends FurtherMeasure> = {
  readonly measure: K;
  readonly rule: string;
  readonly value: (known: Known, sofar: Sofar) => number;
};

type Sofar = (measure: FurtherMeasure) => number;

const fitted =
  (slope: number, start: number) =>
  (known: Known): number =>
    start + slope * known.bustGirth;

/**
 * Upper chest from bust and under-bust: within 7 mm of the upper chest row of ASTM D5585-11e1 (seen), sizes 2 to 20,
 * whose cup hardly changes. How a cup shares is our rule: three tenths of what the bust gains over the same ribs
 * lie above it, and the upper chest stays under the bust by 15 % of bust less under-bust, by 150 at most: beyond that nobody guesses.
 */
export const upperChestByCup = ({ bustGirth, underbustGirth }: Known): number =>
  Math.max(
    bustGirth - 150,
    Math.min(
      0.3 * bustGirth + 0.555 * underbustGirth + 206,
      bustGirth - 0.15 * (bustGirth - underbustGirth),
    ),
  );

/** ASTM D5585-11e1 (seen): within 5 mm of its neck base row. */
export const neckByBust = fitted(0.2096, 175);

/** ASTM D5585-11e1 (seen): within 5 mm of its shoulder girth row. */
export const shoulderGirthByBust = fitted(0.6461, 433.4);

/** ASTM D5585-95 (from memory): within 1 mm of its rows, sizes 2 to 16. */
export const shoulderLengthByBust = fitted(0.0732, 65.4);
export const shoulderWidthByBust = fitted(0.2515, 160.6);
export const acrossBackByBust = fitted(0.2496, 149.4);
export const acrossFrontByBust = fitted(0.2494, 124.2);
export const upperArmByBust = fitted(0.2494, 51.2);

/** Within 2 mm of the scye depth row of ASTM D5585-95 (from memory). */
export const scyeDepthByBust = fitted(0.1026, 98.6);

/** Within 1 mm of Aldrich's wrist row (from memory). */
export const wristByBust = fitted(0.114, 59.3);

/**
 * The back is shorter than the front by the neck's rise and by what the bust pushes out: 15 mm and a tenth of
 * bust less under-bust (common practice, no source; puts the armpit 25 to 60 above the bust point on standard sizes).
 */
export const backWaistByFront = (known: Known): number =>
  known.frontWaistLength - 15 - (known.bustGirth - known.underbustGirth) / 10;

/** The armpit line keeps at least 25 above the bust point, whatever the table would give. */
export const armscyeDepth = (known: Known, sofar: Sofar): number => {
  const back = sofar('backWaistLength');
  if (known.underarmToWaist !== undefined) return back - known.underarmToWaist;
  const bustPointToWaist = known.frontWaistLength - known.sideNeckToBustPoint;
  return Math.min(scyeDepthByBust(known), back - bustPointToWaist - 25);
};

/** Nine sixteenths of waist to floor: Aldrich, waist to knee over waist to floor (from memory), within 2 mm. */
export const waistToKneeByFloor = (known: Known): number => known.waistToFloor * 0.5625;

/** Between under-bust and waist by height, 76 above the waist (our rule); the draft fairs it further. */
export const waistSeamBetween = (known: Known): number => {
  const drop = known.frontWaistLength - known.sideNeckToUnderbust;
  return known.waistGirth + (known.underbustGirth - known.waistGirth) * Math.min(1, 76 / drop);
};

/** Method section 3: two thirds of the way from waist girth to hip girth at half the height, easing in to the hip. */
export const topHipBetween = (known: Known, sofar: Sofar): number => {
  const down = Math.min(1, Math.max(0, sofar('waistToTopHip') / known.waistToHip));
  const share = 1 - (1 - down) ** Math.log2(3);
  return known.waistGirth + share * (known.hipGirth - known.waistGirth);
};

/** Heinz et al. 2003, 260 women: knee = 8.2 cm + 0.283 hip, residual SD 1.7 cm (seen). */
export const kneeByHip = (known: Known): number => 82 + 0.283 * known.hipGirth;

/** A tape round two knees side by side: G (1 + 2/pi) (method section 6). */
export const bothKneesByKnee = (_known: Known, sofar: Sofar): number =>
  sofar('kneeGirth') * (1 + 2 / Math.PI);

/** Aldrich, waist to floor 104 in women of about 164 cm (from memory). */
export const heightByFloor = (known: Known): number => known.waistToFloor / 0.634;

/** Aldrich, sleeve length over waist to floor (from memory), within 1 mm. */
export const armByFloor = (known: Known): number => known.waistToFloor * 0.5613;

const estimate = <K extends FurtherMeasure>(
  measure: K,
  rule: string,
  value: Estimate<K>['value'],
): Estimate<K> => ({
  measure,
  rule,
  value,
});

const astm11 = 'from the bust, after ASTM D5585-11e1';
const astm95 = 'from the bust, after ASTM D5585-95 (from memory)';

/** In an order in which each finds what it needs. */
export const estimates: readonly Estimate<FurtherMeasure>[] = [
  estimate(
    'upperChestGirth',
    'from bust and under-bust, after ASTM D5585-11e1 and our cup rule',
    upperChestByCup,
  ),
  estimate('neckGirth', astm11, neckByBust),
  estimate('shoulderGirth', astm11, shoulderGirthByBust),
  estimate('shoulderLength', astm95, shoulderLengthByBust),
  estimate('shoulderWidth', astm95, shoulderWidthByBust),
  estimate('acrossBack', astm95, acrossBackByBust),
  estimate('acrossFront', astm95, acrossFrontByBust),
  estimate('upperArmGirth', astm95, upperArmByBust),
  estimate('wristGirth', 'from the bust, after Aldrich (from memory)', wristByBust),
  estimate(
    'backWaistLength',
    'from the front waist length, bust and under-bust, trade rule',
    backWaistByFront,
  ),
  estimate(
    'armscyeDepth',
    'from the bust, after ASTM D5585-95 (from memory), kept above the bust point',
    armscyeDepth,
  ),
  estimate(
    'underarmToWaist',
    'back waist length less armhole depth',
    (_known, sofar) => sofar('backWaistLength') - sofar('armscyeDepth'),
  ),
  estimate(
    'waistToKnee',
    'nine sixteenths of waist to floor, after Aldrich (from memory)',
    waistToKneeByFloor,
  ),
  estimate('waistSeamGirth', 'between under-bust and waist by height, our rule', waistSeamBetween),
  estimate('waistToTopHip', 'half of waist to hip, our rule', (known) => known.waistToHip / 2),
  estimate('topHipGirth', 'between waist and hip, our rule', topHipBetween),
  estimate('kneeGirth', 'from the hip, after Heinz et al. 2003', kneeByHip),
  estimate('bothKneesGirth', 'from one knee, a tape round two', bothKneesByKnee),
  estimate('height', 'from waist to floor, after Aldrich (from memory)', heightByFloor),
  estimate('armLength', 'from waist to floor, after Aldrich (from memory)', armByFloor),
  estimate(
    'shoulderSlope',
    'the mean of front and back slope, after Bunka (from memory)',
    () => 20,
  ),
];
