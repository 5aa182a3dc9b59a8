import type { Body, MeasureKey } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { WantedGirth } from '../../drafting/construction.ts';
import type { BalanceLevel, HouseRules } from '../../drafting/house-rules.ts';
import { type Quantity, plus, quarterOf, taken } from '../../drafting/quantity.ts';
import type { LevelName, Side } from '../../drafting/piece.ts';
import { monotoneProfile, xAt } from '../../geometry/profile.ts';
import type { GownStyle } from './style-card.ts';

/** Finished quarter widths of one side of the body, seam line to seam line, by level. */
export type Quarters = { readonly [L in BalanceLevel | 'seam']: Quantity };

type Level = { readonly key: BalanceLevel; readonly name: string; readonly girth: MeasureKey };

const levels: readonly Level[] = [
  { key: 'chest', name: 'upper chest', girth: 'upperChestGirth' },
  { key: 'bust', name: 'bust', girth: 'bustGirth' },
  { key: 'underbust', name: 'under-bust', girth: 'underbustGirth' },
  { key: 'waist', name: 'waist', girth: 'waistGirth' },
  { key: 'topHip', name: 'top hip', girth: 'topHipGirth' },
  { key: 'hip', name: 'hip', girth: 'hipGirth' },
];

/** Bust less under-bust of a middle cup: the balance itself is made for it. */
const middleCup = 140;
/** The front gains by its cup at most this. */
const mostCup = 30;
/** The upper chest follows the bust's cup by this part: the fullness begins above the bust. */
const cupAbove = 0.8;

/**
 * What the front quarter gains, and the back gives, for a cup fuller than the middle one [our rule]:
 * the bust grows in front, a back hardly changes between under-bust and bust.
 */
function cupAt(key: BalanceLevel, body: Body, rules: HouseRules): number {
  if (key !== 'bust' && key !== 'chest') return 0;
  const { bustGirth, underbustGirth } = body.measures;
  const cup = Math.min(
    mostCup,
    rules.cupShare * Math.max(0, bustGirth - underbustGirth - middleCup),
  );
  return key === 'bust' ? cup : cupAbove * cup;
}

/** Ease at the waist seam: between under-bust and waist by height. */
const seamEase = (style: GownStyle, share: number): number =>
  style.ease.underbust + share * (style.ease.waist - style.ease.underbust);

const measured = (name: string, key: MeasureKey, body: Body): Quantity =>
  taken(name, key, body.measures[key], key in body.estimated);

/** Ease at a level; the knee girth is given finished. */
const easeAt = (style: GownStyle, key: BalanceLevel): number =>
  key === 'knee' ? 0 : style.ease[key];

/** Where the raised waist seam lies between under-bust and waist, 0 to 1. */
const seamShare = (levels: BodyLevels, seam: number): number =>
  (seam - levels.underbust) / (levels.waist - levels.underbust);

/**
 * Finished quarters (method section 4): (girth + ease)/4, plus the balance in front and less it in
 * the back. At the waist seam the girth is the measured one, else the monotone cubic through the
 * quarters of the other levels.
 */
export function finishedQuarters(
  side: Side,
  body: Body,
  style: GownStyle,
  rules: HouseRules,
  heights: BodyLevels,
  seam: number,
): Quarters {
  const sign = side === 'front' ? 1 : -1;
  const quarter = (key: BalanceLevel, girth: Quantity): Quantity =>
    plus(
      plus(
        quarterOf(plus(girth, 'ease', easeAt(style, key))),
        'balance',
        sign * rules.balance[key],
      ),
      'cup',
      sign * cupAt(key, body, rules),
    );
  const at = (level: Level): Quantity =>
    quarter(level.key, measured(level.name, level.girth, body));
  const [chest, bust, underbust, waist, topHip, hip] = levels.map(at);
  if (!chest || !bust || !underbust || !waist || !topHip || !hip)
    throw new Error('levels are listed above');
  const knee = quarter('knee', {
    value: style.kneeFinished,
    how: ['finished knee ', { mm: style.kneeFinished }],
    measures: [],
  });
  if (style.waistSeam !== 'raised')
    return { chest, bust, underbust, waist, topHip, hip, knee, seam: waist };
  const share = seamShare(heights, seam);
  const seamQuarter: Quantity =
    'waistSeamGirth' in body.estimated
      ? {
          value: xAt(
            monotoneProfile([
              { y: heights.underarm, x: chest.value },
              { y: heights.bust, x: bust.value },
              { y: heights.underbust, x: underbust.value },
              { y: heights.waist, x: waist.value },
              { y: heights.topHip, x: topHip.value },
              { y: heights.hip, x: hip.value },
            ]),
            seam,
          ),
          how: ['the smooth line through the quarters above and below'],
          measures: [],
        }
      : plus(
          quarterOf(
            plus(
              measured('waist seam girth', 'waistSeamGirth', body),
              'ease',
              seamEase(style, share),
            ),
          ),
          'balance',
          sign *
            (rules.balance.underbust + share * (rules.balance.waist - rules.balance.underbust)),
        );
  return { chest, bust, underbust, waist, topHip, hip, knee, seam: seamQuarter };
}

const levelName: { readonly [K in BalanceLevel]: LevelName } = {
  chest: 'chest',
  bust: 'bust',
  underbust: 'underbust',
  waist: 'waist',
  topHip: 'top-hip',
  hip: 'hip',
  knee: 'knee-seam',
};

/** The girths the draft promises at every level: body and ease, whole-body millimetres. */
export function wantedGirths(
  body: Body,
  style: GownStyle,
  heights: BodyLevels,
  seamLevel: number,
  seamGirth: number,
): readonly WantedGirth[] {
  const rows: WantedGirth[] = levels.map(({ key, girth }) => ({
    level: levelName[key],
    body: body.measures[girth],
    ease: easeAt(style, key),
    wanted: body.measures[girth] + easeAt(style, key),
    estimated: girth in body.estimated,
  }));
  const knee: WantedGirth = { level: 'knee-seam', wanted: style.kneeFinished, estimated: false };
  if (style.waistSeam === 'none') return [...rows, knee];
  if (style.waistSeam === 'natural')
    return [
      ...rows.map((row) =>
        row.level === 'waist' ? { ...row, level: 'waist-seam' as const } : row,
      ),
      knee,
    ];
  const ease = seamEase(style, seamShare(heights, seamLevel));
  const seam: WantedGirth = {
    level: 'waist-seam',
    body: seamGirth - ease,
    ease,
    wanted: seamGirth,
    estimated: 'waistSeamGirth' in body.estimated,
  };
  return [...rows.slice(0, 3), seam, ...rows.slice(3), knee];
}
