import fc from 'fast-check';
import type { Body } from '#shared/body/card.ts';
import type { BodyLevels } from '#shared/body/levels.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { drawGown } from '#shared/drafts/gown/draw-gown.ts';
import { resolveStyle } from '#shared/drafts/gown/resolve-style.ts';
import { checkStyle } from '#shared/drafts/gown/style-check.ts';
import {
  easeLevels,
  isOffShoulder,
  styleChoices,
  styleLengths,
} from '#shared/drafts/gown/style-card.ts';
import type {
  EaseLevel,
  GownStyle,
  StyleCard,
  StyleChoice,
  StyleLength,
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
  /** A choice of each kind by name, or none. */
  readonly named: { readonly [C in StyleChoice]: StyleCard[C] };
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
  named: fc.record({
    topLine: fc.constantFrom(...styleChoices.topLine, undefined),
    shaping: fc.constantFrom(...styleChoices.shaping, undefined),
    waistSeam: fc.constantFrom(...styleChoices.waistSeam, undefined),
    flare: fc.constantFrom(...styleChoices.flare, undefined),
    sleeve: fc.constantFrom(...styleChoices.sleeve, undefined),
    closure: fc.constantFrom(...styleChoices.closure, undefined),
    facing: fc.constantFrom(...styleChoices.facing, undefined),
    lining: fc.constantFrom(...styleChoices.lining, undefined),
    boning: fc.constantFrom(...styleChoices.boning, undefined),
    cloth: fc.constantFrom(...styleChoices.cloth, undefined),
  }),
  choices: fc.record(Object.fromEntries(styleKeys.map((key) => [key, draw]))),
});

/** Bounds of these hang on none of the others, or only on those before them. */
const order: readonly StyleLength[] = [
  'heelHeight',
  'kneeLevel',
  'topDrop',
  ...styleLengths.filter(
    (key) => !['heelHeight', 'kneeLevel', 'topDrop', 'hemSweep', 'train'].includes(key),
  ),
];

/** Bounds of these hang on the seams there are, so on the shaping too. */
const hems: readonly StyleLength[] = ['hemSweep', 'train'];

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
  const { shaping: wished, ...named } = draws.named;
  // Shaping first: how wide a hem may be hangs on the seams it leaves.
  let style: StyleCard = {
    ...(fits(eased) ? eased : {}),
    ...(wished === undefined ? {} : { shaping: wished }),
  };
  for (const [choice, name] of Object.entries(named)) {
    const more = { ...style, ...(name === undefined ? {} : { [choice]: name }) };
    // Choices that exclude each other are refused by name; what is drawn keeps the first of the two.
    if (fits(more)) style = more;
  }
  const put = (key: StyleLength): void => {
    const choice = given(key);
    if (choice === undefined) return;
    style = { ...style, [key]: placed(styleLimits(body, levels, style)[key], choice.at) };
  };
  order.forEach(put);
  const reaches = wished === 'darts' && dartsReach(style, body, levels);
  const shaping = wished === 'darts' && !reaches ? 'princess' : wished;
  if (shaping !== undefined) style = { ...style, shaping };
  hems.forEach(put);
  if (!bandFits(style, body, levels))
    return styleOn({ ...draws, named: { ...draws.named, sleeve: 'none' } }, body, levels);
  if (fits(style) && sideIsFair(style, body, levels)) return style;
  // Ease, stretch and bands that do not go together, or that no fair side seam passes, are left open.
  const { ease: _ease, stretch: _stretch, armEase: _armEase, ...plain } = style;
  // So is what was drawn between bounds that hang on them.
  const { kneeFinished: _knee, hemSweep: _hem, train: _train, ...rest } = plain;
  // Without its ease a bust may be fuller than darts reach.
  return rest.shaping === 'darts' && !dartsReach(rest, body, levels)
    ? { ...rest, shaping: 'princess' }
    : rest;
}

/** Whether bands hold these top edges on the arms: what the draft refuses is not a style to draw. */
const bandFits = (style: StyleCard, body: Body, levels: BodyLevels): boolean =>
  !isOffShoulder(style) ||
  !['band-loose', 'band-too-full'].some((reason) =>
    refusedFor(reason, resolveStyle(style, body, levels), body, levels),
  );

/** Whether the side seam passes the girths this ease makes: what the draft refuses is not a style to draw. */
const sideIsFair = (style: StyleCard, body: Body, levels: BodyLevels): boolean =>
  !refusedFor('side-bends', resolveStyle(style, body, levels), body, levels);

/** Whether darts can shape this bust under either preset: what the draft refuses is not a style to draw. */
function dartsReach(style: StyleCard, body: Body, levels: BodyLevels): boolean {
  // Below the knee nothing hangs on the darts, and a refusal there would hide theirs.
  const darted = resolveStyle({ ...style, shaping: 'darts', flare: 'circle' }, body, levels);
  return !refusedFor('darts-too-wide', darted, body, levels);
}

/** Whether either preset refuses a style for this reason. */
const refusedFor = (reason: string, style: GownStyle, body: Body, levels: BodyLevels): boolean =>
  Object.values(houseRulePresets).some((rules) => {
    try {
      drawGown(openTable(), body, levels, style, rules);
      return false;
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error;
      return error.problems.some(({ code }) => code === reason);
    }
  });

function easeOf(limits: StyleLimits, given: (key: StyleKey) => Draw | undefined): StyleCard {
  const ease: { [L in EaseLevel]?: number } = {};
  for (const level of easeLevels) {
    const choice = given(`ease.${level}`);
    if (choice !== undefined) ease[level] = placed(limits[`ease.${level}`], choice.at);
  }
  return { ease };
}
