import { DraftingError } from '../drafting/drafting-error.ts';
import { type Drafted, type DraftedInputs, draftAny } from '../engine/drafted.ts';
import { type Problem, error } from '../units/problem.ts';
import { said } from '../units/said.ts';
import { type GradeRules, checkGradeRules, mostSizes, stepCard } from './grade-rules.ts';
import { settledCounts } from './settled-counts.ts';
import { type Depths, type HeldDepth, inputsOn } from './style-depths.ts';

/** What a nest is asked for with: sizes under and over the one that is there. */
export type NestOrder = {
  readonly rules: GradeRules;
  readonly smaller: number;
  readonly larger: number;
  readonly depths: Depths;
};

/** A size of a nest, so many steps from the card's own. */
export type NestSize = {
  readonly step: number;
  readonly draft: Drafted;
  /** Depths this size could not keep as they were drawn. */
  readonly held: readonly HeldDepth[];
};

/** A size that cannot be drawn, and why. */
export type RefusedSize = { readonly step: number; readonly problems: readonly Problem[] };

/** Sizes of one draft, smallest first, all with the darts and gores of the largest. */
export type Nest = {
  readonly sizes: readonly NestSize[];
  readonly refused: readonly RefusedSize[];
};

/** A size as it is lettered: steps from the card's own. */
export const sizeLabel = (step: number): string => {
  if (step === 0) return 'base';
  return step > 0 ? `+${step}` : `\u2212${-step}`;
};

/** What is wrong with the order itself. */
export function checkNest({ rules, smaller, larger }: NestOrder): readonly Problem[] {
  const sizes = smaller + larger + 1;
  const counted = [smaller, larger].every((each) => Number.isInteger(each) && each >= 0);
  if (counted && sizes <= mostSizes) return checkGradeRules(rules);
  return [
    error({
      code: 'too-many-sizes',
      field: 'larger',
      with: ['smaller'],
      said: said`A nest holds the card’s own size and up to ${mostSizes - 1} more: ask for fewer smaller or larger ones.`,
    }),
    ...checkGradeRules(rules),
  ];
}

type Counts = DraftedInputs['rules']['counts'];

function drawSize(
  base: Drafted,
  { rules, depths }: NestOrder,
  step: number,
  counts: Counts,
): NestSize | RefusedSize {
  const card = stepCard(base.inputs.card, rules, step, base.body.measures);
  try {
    // The card's own size is drawn as it was, by the counts of the largest.
    const { inputs, held } =
      step === 0 ? { inputs: base.inputs, held: [] } : inputsOn(base, card, depths);
    const house = counts === undefined ? inputs.rules : { ...inputs.rules, counts };
    return { step, draft: draftAny(withRules(inputs, house)), held };
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    return { step, problems: error.problems };
  }
}

/** The same garment by other house rules. */
function withRules(inputs: DraftedInputs, rules: DraftedInputs['rules']): DraftedInputs {
  return { ...inputs, rules };
}

const isDrawn = (size: NestSize | RefusedSize): size is NestSize => 'draft' in size;

/**
 * The sizes of a draft by grade rules: each is drafted afresh from its stepped card. The largest that
 * can be drawn is drawn first and settles the numbers of darts and gores.
 * @throws DraftingError where the order itself is wrong.
 */
export function nestOf(base: Drafted, order: NestOrder): Nest {
  const wrong = checkNest(order);
  if (wrong.length > 0) throw new DraftingError(wrong);
  const steps = Array.from(
    { length: order.smaller + order.larger + 1 },
    (_, k) => k - order.smaller,
  );
  let counts: Counts;
  const made: (NestSize | RefusedSize)[] = [];
  for (const step of steps.toReversed()) {
    const size = drawSize(base, order, step, counts);
    if (counts === undefined && isDrawn(size)) counts = settledCounts(size.draft.pieces);
    made.unshift(size);
  }
  return {
    sizes: made.filter(isDrawn),
    refused: made.filter((each): each is RefusedSize => !isDrawn(each)),
  };
}
