import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { easeLimits, usualStretch } from './ease-limits.ts';
import { type FlareChoices, longestTrainOf, widestHem } from './flare-limits.ts';
import { easeLevels, styleChoices, styleLengths } from './style-card.ts';
import { isOffShoulder } from './style-card.ts';
import type { EaseLevel, StyleCard, StyleLength, TopLineShape } from './style-card.ts';
import { outsideAxis } from './top-line-points.ts';

/** Bounds of one style choice and what it is when left open, millimetres (the `plainNumbers` as they are). */
export type Limit = { readonly min: number; readonly max: number; readonly initial: number };

/** Dotted keys as the contract writes them. */
export type StyleKey = StyleLength | `ease.${EaseLevel}`;
export type StyleLimits = { readonly [K in StyleKey]: Limit };

/** Every style choice that has bounds, in the order of the style card. */
export const styleKeys: readonly StyleKey[] = [
  ...styleLengths,
  ...easeLevels.map((level): StyleKey => `ease.${level}`),
];

/** A limit whose bounds stay in order on any body, with the initial value between them. */
const limit = (min: number, max: number, initial: number): Limit => {
  const top = Math.max(min, max);
  return { min, max: top, initial: Math.min(top, Math.max(min, initial)) };
};

/** A choice out of its own bounds must not bend the bounds of those that hang on it. */
const within = (value: number | undefined, { min, max, initial }: Limit): number =>
  value === undefined || Number.isNaN(value) ? initial : Math.min(max, Math.max(min, value));

/** A back top line may not rise nearer to the nape than this (common practice, no source). */
const belowNape = 90;

/** Steepest mean run of a side seam from hip in to the knee seam: 27 degrees (our rule). */
const steepestRun = 0.5;

/** The least of hip and knee the straight part of a skirt needs between them (our rule). */
const leastHipToKneeSeam = 150;

/** Girths a wearer can stand and step in at the knee seam (method section 6, walking). */
function kneeFinished(body: Body, levels: BodyLevels, kneeLevel: number, hipEase: number): Limit {
  const { bothKneesGirth, hipGirth } = body.measures;
  const run = levels.knee - kneeLevel - levels.hip;
  const standing = bothKneesGirth + 40;
  const notTooSteep = hipGirth + hipEase - 4 * steepestRun * run;
  const least = Math.ceil(Math.max(standing, notTooSteep));
  return limit(least, Math.max(hipGirth + 100, least + 60), Math.max(762, 0.76 * hipGirth));
}

/** The back top line at the centre back, above the waist. */
function backDepth(body: Body, levels: BodyLevels, initial: number): Limit {
  const least = Math.max(100, Math.ceil(levels.waist - levels.bust + 10));
  const most = Math.min(
    Math.max(250, least + 60, initial + 30),
    body.measures.backWaistLength - belowNape,
  );
  return limit(least, most, initial);
}

/** On a small bust the end is kept inside the side: the peak lies this far inside the bust's quarter. */
const peakInside = 80;
/** Off the shoulder the peak lies this far inside the end of the top line at least. */
const insideEnd = 30;
/** An armhole this deep at least lies between the band's edge and the underarm. */
const leastArmhole = 30;
/** Off the shoulder the back dips this much from the arms to the centre. */
const backDip = 10;

/** A raised waist seam lies at least this over the waist, and this under the under-bust. */
const leastRise = 20;
export const seamUnderBust = 20;

/** A train is at most this long, whatever the flare (our rule). */
const longestOfAll = 1500;

/** The hem of an A-line, of godets or of seams that run on outwards (a fifth of a circle more than the knee), and the train. */
function hems(
  flare: FlareChoices,
  hemSweep: number | undefined,
): { readonly hemSweep: Limit; readonly train: Limit } {
  const { kneeFinished: knee, flareLength: depth } = flare;
  // How long a train godets may have hangs on the knee alone, so their hem may look to it.
  const longest = flare.flare === 'godets' ? longestTrainOf(flare, knee) : 0;
  const sweep = limit(knee + 100, widestHem(flare, longest), knee + 0.4 * Math.PI * depth);
  const train = Math.min(longestOfAll, longestTrainOf(flare, within(hemSweep, sweep)));
  return { hemSweep: sweep, train: limit(0, Math.floor(train), 0) };
}

/**
 * A dip this wide for the root of its depth bends no tighter than 12 mm at the centre, which an enclosed
 * allowance still turns round (our rule; the radius of the curve `top-line` draws).
 */
const narrowestDip = 3.4;
/** A notch is wider for its depth: its edge must not stand so steep that the fold cuts its allowance. */
const narrowestNotch = 6;

/** Centre and peak of the top line: a straight one lies level with its peak, a scooped one is wide and deep. */
function neck(
  shape: TopLineShape,
  peak: number,
  bust: number,
  bustSpan: number,
  widest: number,
  chosenDepth: number | undefined,
): { readonly neckDepth: Limit; readonly neckWidth: Limit } {
  if (shape === 'straight') {
    return { neckDepth: limit(peak, peak, peak), neckWidth: limit(40, widest, 76) };
  }
  const scooped = shape === 'scooped';
  // A notch needs some depth to be one.
  const neckDepth = limit(
    shape === 'notched' ? peak + 15 : peak,
    bust - 20,
    peak + (scooped ? 50 : 35),
  );
  const dip = shape === 'notched' ? narrowestNotch : narrowestDip;
  const narrowest = Math.max(40, dip * Math.sqrt(within(chosenDepth, neckDepth) - peak));
  return { neckDepth, neckWidth: limit(narrowest, widest, scooped ? bustSpan / 2 : 76) };
}

/**
 * Bounds and initial value of every style choice on this body, millimetres (method section 6 and, where it is silent,
 * our own rules named above). Bounds that hang on another choice take it from `style`, or its own initial value.
 */
export function styleLimits(body: Body, levels: BodyLevels, style: StyleCard = {}): StyleLimits {
  const eases = easeLimits(body, style);
  const { bustGirth, bustSpan, waistToHip } = body.measures;
  const offShoulder = isOffShoulder(style);
  // Off the shoulder the peak lies inside the end of the top line.
  const outer = Math.max(body.measures.acrossFront / 2, bustSpan / 2 + outsideAxis);
  const widestNeck = Math.min(
    bustSpan / 2 + 40,
    offShoulder ? Math.min(outer - insideEnd, bustGirth / 4 - peakInside) : Infinity,
  );
  const topDrop = offShoulder
    ? limit(90, Math.min(levels.bust - 60, levels.underarm - leastArmhole), 127)
    : limit(levels.bust - 110, levels.bust - 60, levels.bust - 85);
  const peak = within(style.topDrop, topDrop);
  const longestDart = Math.min(150, waistToHip - 45);
  const highestKnee = Math.min(250, levels.knee - levels.hip - leastHipToKneeSeam);
  const kneeLevel = limit(0, highestKnee, 100);
  const seamAboveKnee = within(style.kneeLevel, kneeLevel);
  const heelHeight = limit(0, 150, 50);
  const seamToFloor =
    levels.floor - levels.knee + seamAboveKnee + within(style.heelHeight, heelHeight);
  const shortestFlare = 150;
  const floorClearance = limit(0, seamToFloor - shortestFlare, 20);
  const flareLength = limit(
    shortestFlare,
    seamToFloor,
    seamToFloor - within(style.floorClearance, floorClearance),
  );
  const finishedKnee = kneeFinished(
    body,
    levels,
    seamAboveKnee,
    within(style.ease?.hip, eases['ease.hip']),
  );
  const sideDepth = offShoulder
    ? limit(peak, levels.underarm - leastArmhole, 165)
    : limit(
        Math.max(peak, Math.min(levels.underarm, levels.bust - 15)),
        levels.bust - 10,
        Math.min(levels.underarm + 10, levels.bust - 15),
      );
  const flareFraction = limit(0.25, 1, 0.5);
  const clothWidth = limit(700, 3000, 1450);
  const flare: FlareChoices = {
    flare: style.flare ?? styleChoices.flare[0],
    waistSeam: style.waistSeam ?? styleChoices.waistSeam[0],
    shaping: style.shaping ?? styleChoices.shaping[0],
    kneeFinished: within(style.kneeFinished, finishedKnee),
    flareLength: within(style.flareLength, flareLength),
    flareFraction: within(style.flareFraction, flareFraction),
    clothWidth: within(style.clothWidth, clothWidth),
  };
  const highestSeam = Math.max(leastRise, levels.waist - levels.underbust - seamUnderBust);
  return {
    topDrop,
    ...neck(
      style.topLine ?? 'sweetheart',
      peak,
      levels.bust,
      bustSpan,
      widestNeck,
      style.neckDepth,
    ),
    sideDepth,
    backDepth: backDepth(
      body,
      levels,
      offShoulder ? levels.waist - within(style.sideDepth, sideDepth) - backDip : 180,
    ),
    waistSeamRise: limit(leastRise, highestSeam, 76),
    dartLength: limit(Math.min(100, longestDart - 15), longestDart, 127),
    kneeLevel,
    kneeFinished: finishedKnee,
    flareFraction,
    ...hems(flare, style.hemSweep),
    flareLength,
    floorClearance,
    heelHeight,
    bandHeight: limit(60, 200, 110),
    pleatRatio: limit(1, 3, 2.5),
    armEase: limit(-40, 60, 0),
    stretch: limit(0, 100, style.cloth === 'stretch' ? usualStretch : 0),
    shrinkage: limit(0, 10, 0),
    clothWidth,
    ...eases,
  };
}
