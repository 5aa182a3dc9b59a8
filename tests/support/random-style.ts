import fc from 'fast-check';
import type { Body } from '#shared/body/card.ts';
import type { BodyLevels } from '#shared/body/levels.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { drawGown } from '#shared/drafts/gown/draw-gown.ts';
import { resolveStyle } from '#shared/drafts/gown/resolve-style.ts';
import { checkStyle } from '#shared/drafts/gown/style-check.ts';
import { easeLevels, styleLengths, topLineShapes } from '#shared/drafts/gown/style-card.ts';
import type {
  EaseLevel,
  StyleCard,
  StyleLength,
  TopLineShape,
} from '#shared/drafts/gown/style-card.ts';
import {
  styleKeys,
  styleLimits,
  type Limit,
  type StyleKey,
  type StyleLimits,
} from '#shared/drafts/gown/style-limits.ts';

type Draw = { readonly at: number; readonly open: boolean };

/** One draw a choice, made before the body is known. */
export type StyleDraws = {
  readonly shaping: 'princess' | 'darts' | undefined;
  readonly topLine: TopLineShape | undefined;
  readonly choices: Readonly<Record<string, Draw>>;
};

/** From 0 to 1, evenly: `fc.double` would draw nearly everything next to nothing. */
const share = fc.integer({ min: 0, max: 10_000 }).map((part) => part / 10_000);

const draw = fc.record({
  at: share,
  open: fc.boolean(),
});

/** Draws for a style on a body not yet known; `styleOn` puts them between that body's limits. */
export const styleDraws: fc.Arbitrary<StyleDraws> = fc.record({
  shaping: fc.constantFrom('princess', 'darts', undefined),
  topLine: fc.constantFrom(...topLineShapes, undefined),
  choices: fc.record(Object.fromEntries(styleKeys.map((key) => [key, draw]))),
});

/** Bounds of these hang on none of the others, or only on those before them. */
const order: readonly StyleLength[] = [
  'heelHeight',
  'kneeLevel',
  'topDrop',
  ...styleLengths.filter((key) => !['heelHeight', 'kneeLevel', 'topDrop'].includes(key)),
];

const placed = ({ min, max }: Limit, at: number): number => min + (max - min) * at;

/**
 * The style card these draws give on a body: every choice within its limits or left open. Ease that would turn the
 * bust is left open too, and darts that would not reach become a princess seam.
 */
export function styleOn(draws: StyleDraws, body: Body, levels: BodyLevels): StyleCard {
  const given = (key: StyleKey): Draw | undefined =>
    draws.choices[key]?.open === false ? draws.choices[key] : undefined;
  const eased = easeOf(styleLimits(body, levels), given);
  const fits = (style: StyleCard): boolean =>
    checkStyle(style, body, levels).every(({ severity }) => severity === 'warning');
  let style: StyleCard = {
    ...(fits(eased) ? eased : {}),
    ...(draws.topLine === undefined ? {} : { topLine: draws.topLine }),
  };
  for (const key of order) {
    const choice = given(key);
    if (choice === undefined) continue;
    style = { ...style, [key]: placed(styleLimits(body, levels, style)[key], choice.at) };
  }
  const reaches = draws.shaping === 'darts' && dartsReach(style, body, levels);
  const shaping = draws.shaping === 'darts' && !reaches ? 'princess' : draws.shaping;
  return shaping === undefined ? style : { ...style, shaping };
}

/** Whether darts can shape this bust under either preset: what the draft refuses is not a style to draw. */
function dartsReach(style: StyleCard, body: Body, levels: BodyLevels): boolean {
  const darted = resolveStyle({ ...style, shaping: 'darts' }, body, levels);
  return Object.values(houseRulePresets).every((rules) => {
    try {
      drawGown(openTable(), body, levels, darted, rules);
      return true;
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error;
      return !error.problems.some(({ code }) => code === 'darts-too-wide');
    }
  });
}

function easeOf(limits: StyleLimits, given: (key: StyleKey) => Draw | undefined): StyleCard {
  const ease: { [L in EaseLevel]?: number } = {};
  for (const level of easeLevels) {
    const choice = given(`ease.${level}`);
    if (choice !== undefined) ease[level] = placed(limits[`ease.${level}`], choice.at);
  }
  return { ease };
}
