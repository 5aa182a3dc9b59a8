import type { MeasureCard } from '../body/card.ts';
import { completeCard } from '../body/complete-card.ts';
import { openTable } from '../drafting/drafting-table.ts';
import { gownLevels } from '../drafts/gown/levels.ts';
import type { StyleCard } from '../drafts/gown/style-card.ts';
import { styleLimits } from '../drafts/gown/style-limits.ts';
import type { Draft } from '../engine/draft.ts';
import type { Drafted, DraftedInputs } from '../engine/drafted.ts';

/** Depths of a gown's top edge on its style card; the bounds of those below hang on the peak. */
export const depthKeys = ['topDrop', 'neckDepth', 'sideDepth', 'backDepth'] as const;
export type DepthKey = (typeof depthKeys)[number];

/**
 * What becomes of a depth on another body: it stays what was drawn, or grows with side neck to bust
 * point; one left out is as the style card says, and follows the body where that leaves it open.
 */
export type Depths = { readonly [K in DepthKey]?: 'fixed' | 'proportional' };

/** Depths stay as they were drawn unless somebody marks them (method section 10). */
export const fixedDepths: Depths = {
  topDrop: 'fixed',
  neckDepth: 'fixed',
  sideDepth: 'fixed',
  backDepth: 'fixed',
};

/** A depth the other body cannot wear as it was, and the nearest one it can, mm. */
export type HeldDepth = {
  readonly key: DepthKey;
  readonly wanted: number;
  readonly given: number;
};

/** What a draft is drafted from on another body, and which depths had to give way there. */
export type GradedInputs = {
  readonly inputs: DraftedInputs;
  readonly held: readonly HeldDepth[];
};

/** A thousandth of a millimetre is finer than anything drawn, and short to keep. */
const tidy = (mm: number): number => Math.round(mm * 1000) / 1000;

function styleFor(draft: Draft, card: MeasureCard, depths: Depths) {
  const body = completeCard(card);
  const levels = gownLevels(openTable(), body);
  const ratio = card.sideNeckToBustPoint / draft.body.measures.sideNeckToBustPoint;
  let style: StyleCard = draft.inputs.style;
  const held: HeldDepth[] = [];
  for (const key of depthKeys) {
    const rule = depths[key];
    if (rule === undefined) continue;
    const wanted = tidy(draft.style[key] * (rule === 'proportional' ? ratio : 1));
    const { min, max } = styleLimits(body, levels, style)[key];
    const given = Math.min(max, Math.max(min, wanted));
    if (given !== wanted) held.push({ key, wanted, given });
    style = { ...style, [key]: given };
  }
  return { style, held };
}

/**
 * What a draft is drafted from on another body: the same garment, style and rules, its depths by their
 * rule. A depth outside what that body can wear takes the nearest it can, and is named.
 */
export function inputsOn(draft: Drafted, card: MeasureCard, depths: Depths): GradedInputs {
  if (draft.garment !== 'gown') return { inputs: { ...draft.inputs, card }, held: [] };
  const { style, held } = styleFor(draft, card, depths);
  return { inputs: { ...draft.inputs, card, style }, held };
}
