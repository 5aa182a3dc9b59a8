import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { readingGrace } from '../../units/format-length.ts';
import { error, warning, type Problem } from '../../units/problem.ts';
import { mm, said, type Said } from '../../units/said.ts';
import { aboutCloth, closedEdge } from './cloth-check.ts';
import { resolveStyle } from './resolve-style.ts';
import { isPlainNumber, type EaseLevel, type GownStyle, type StyleCard } from './style-card.ts';
import { styleLabels } from './style-labels.ts';
import { styleKeys, styleLimits, type Limit, type StyleKey } from './style-limits.ts';

/** The fields a bound hangs on, beside the one that breaks it. */
const hangsOn: { readonly [K in StyleKey]?: readonly string[] } = {
  topDrop: ['card.sideNeckToBustPoint'],
  neckDepth: ['style.topDrop', 'card.sideNeckToBustPoint'],
  neckWidth: ['style.neckDepth', 'card.bustSpan'],
  sideDepth: ['style.topDrop', 'card.underarmToWaist'],
  backDepth: ['card.frontWaistLength', 'card.sideNeckToBustPoint'],
  dartLength: ['card.waistToHip'],
  kneeLevel: ['card.waistToKnee', 'card.waistToHip'],
  kneeFinished: ['style.kneeLevel', 'card.hipGirth', 'card.kneeGirth'],
  flareLength: ['style.kneeLevel', 'style.heelHeight', 'card.waistToFloor'],
  floorClearance: ['style.kneeLevel', 'style.heelHeight', 'card.waistToFloor'],
  hemSweep: ['style.flare', 'style.flareLength', 'style.kneeFinished', 'style.waistSeam'],
  train: ['style.flare', 'style.flareFraction', 'style.hemSweep', 'style.flareLength'],
};

/** Why a bound is where it is, below and above, for those where a number alone does not say it. */
const because: {
  readonly [K in StyleKey]?: { readonly less?: string; readonly more?: string };
} = {
  neckDepth: {
    less: ' The centre may not lie above the peak.',
    more: ' The centre stays above the bust point.',
  },
  kneeFinished: {
    less: ' Less would not close round both knees, or would cut in too steeply under the hip: widen it, or move the knee seam.',
    more: ' More would be wider than the hip, and the flare would hardly show: narrow it.',
  },
  flareLength: {
    more: ' A longer flare would lie on the floor: shorten it, or set higher heels.',
  },
  dartLength: { more: ' The back dart is longer and must end above the hip.' },
  hemSweep: {
    less: ' A narrower hem would hardly show below the knee: widen it, or narrow the knee.',
    more: ' This kind of flare makes no wider hem: choose a circle, or give it more seams by leaving out the waist seam.',
  },
  train: {
    more: ' The hem would fall away to it too steeply: give the flare more of a circle or a wider hem, or shorten the train.',
  },
};

const valueOf = (style: StyleCard, key: StyleKey): number | undefined => {
  const level = easeLevelOf(key);
  return level === undefined ? style[lengthKey(key)] : style.ease?.[level];
};

const easeLevelOf = (key: StyleKey): EaseLevel | undefined =>
  key.startsWith('ease.') ? levelAfterDot(key) : undefined;

const levelAfterDot = (key: StyleKey): EaseLevel => key.slice('ease.'.length) as EaseLevel;
const lengthKey = (key: StyleKey) => key as Exclude<StyleKey, `ease.${EaseLevel}`>;

const worded = (key: StyleKey, value: number): Said =>
  isPlainNumber(key) ? [String(Number(value.toPrecision(4)))] : [mm(value)];

function checkLimit(
  key: StyleKey,
  value: number | undefined,
  { min, max }: Limit,
): readonly Problem[] {
  if (value === undefined) return [];
  const parts = { field: `style.${key}`, ...(hangsOn[key] && { with: hangsOn[key] }) };
  const label = styleLabels[key];
  if (!Number.isFinite(value)) {
    return [
      error({
        code: 'not-a-number',
        field: parts.field,
        said: said`${label} is not a number: type it again, or leave it open.`,
      }),
    ];
  }
  const grace = isPlainNumber(key) ? 0 : readingGrace;
  if (value >= min - grace && value <= max + grace) return [];
  return [
    error({
      code: 'out-of-range',
      ...parts,
      said: said`${label} ${worded(key, value)} must lie between ${worded(key, min)} and ${worded(key, max)} on this body: change it, or leave it open.${because[key]?.[value < min ? 'less' : 'more'] ?? ''}`,
    }),
  ];
}

/** The bust must stay the larger of two finished girths by this much, or the front could not be shaped (our rule). */
const leastUnderTheBust = 10;

function checkEase(body: Body, style: GownStyle): readonly Problem[] {
  const bust = body.measures.bustGirth + style.ease.bust;
  const underbust = body.measures.underbustGirth + style.ease.underbust;
  if (bust - underbust >= leastUnderTheBust) return [];
  return [
    error({
      code: 'ease-turns-bust',
      field: 'style.ease.underbust',
      with: ['style.ease.bust', 'card.bustGirth', 'card.underbustGirth'],
      said: said`Finished under-bust ${mm(underbust)} must be at least ${mm(leastUnderTheBust)} less than finished bust ${mm(bust)}: take ease from the under-bust, or give the bust more.`,
    }),
  ];
}

/** How far the finished chest may lie under (first) and over the finished bust. */
const chestAgainstBust = { under: 260, over: 60 };

function checkChest(body: Body, style: GownStyle): readonly Problem[] {
  const bust = body.measures.bustGirth + style.ease.bust;
  const chest = body.measures.upperChestGirth + style.ease.chest;
  const { under, over } = chestAgainstBust;
  if (bust - chest <= under && chest - bust <= over) return [];
  return [
    error({
      code: 'ease-parts-chest-and-bust',
      field: 'style.ease.chest',
      with: ['style.ease.bust', 'card.upperChestGirth', 'card.bustGirth'],
      said: said`Finished chest ${mm(chest)} must lie between ${mm(bust - under)} and ${mm(bust + over)} beside finished bust ${mm(bust)}: change the ease at the chest or at the bust.`,
    }),
  ];
}

function unlikely(style: GownStyle, given: StyleCard): readonly Problem[] {
  const notes: Problem[] = [];
  if (style.kneeFinished < 600) {
    notes.push(
      warning({
        code: 'narrow-knee',
        field: 'style.kneeFinished',
        said: said`Finished knee ${mm(style.kneeFinished)} is under ${mm(600)}: the wearer can take only short steps, and stairs and kerbs need care. Try it at a fitting, or widen it.`,
      }),
    );
  }
  if (style.floorClearance < 10) {
    notes.push(
      warning({
        code: 'hem-on-floor',
        field: given.flareLength === undefined ? 'style.floorClearance' : 'style.flareLength',
        said: said`The hem hangs ${mm(style.floorClearance)} above the floor: it will be stepped on, on stairs above all. About ${mm(20)} is usual.`,
      }),
    );
  }
  if (
    given.flareLength !== undefined &&
    given.floorClearance !== undefined &&
    Math.abs(given.floorClearance - style.floorClearance) > 1
  ) {
    notes.push(
      warning({
        code: 'clearance-not-used',
        field: 'style.floorClearance',
        with: ['style.flareLength'],
        said: said`Flare length ${mm(style.flareLength)} is given, so the hem hangs ${mm(style.floorClearance)} above the floor and not ${mm(given.floorClearance)}: leave one of the two open.`,
      }),
    );
  }
  return notes;
}

/**
 * What is wrong (errors) or unlikely (warnings) in a style card on this body, in the order of the card. Combinations are
 * looked at only when every choice lies within its own bounds.
 */
export function checkStyle(style: StyleCard, body: Body, levels: BodyLevels): readonly Problem[] {
  const limits = styleLimits(body, levels, style);
  const alone = styleKeys.flatMap((key) => checkLimit(key, valueOf(style, key), limits[key]));
  if (alone.length > 0) return alone;
  const resolved = resolveStyle(style, body, levels);
  return [
    ...checkEase(body, resolved),
    ...checkChest(body, resolved),
    ...closedEdge(body, resolved),
    ...aboutCloth(resolved),
    ...unlikely(resolved, style),
  ];
}
