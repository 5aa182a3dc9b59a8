import { coreMeasures, furtherMeasures, type MeasureCard, type MeasureKey } from '../body/card.ts';
import type { Alignment } from '../compare/alignment.ts';
import { type FigureRow, figureRows, figuresOf } from '../compare/figures.ts';
import { type PointMove, pointMoves } from '../compare/points.ts';
import { DraftingError } from '../drafting/drafting-error.ts';
import { type Drafted, draftAny } from '../engine/drafted.ts';
import type { Problem } from '../units/problem.ts';
import { type Depths, type HeldDepth, inputsOn } from './style-depths.ts';

/** A measure that is another one on the new card, and what it does alone. */
export type Cause = {
  readonly measure: MeasureKey;
  /** Absent where it was not taken then, or is not now. */
  readonly from?: number;
  readonly to?: number;
  /** Why no draft could be made with this one changed alone: its part is in the interplay then. */
  readonly problems?: readonly Problem[];
};

/** What one measure alone moves a figure by, mm (mm² for an area). */
export type Share = { readonly measure: MeasureKey; readonly change: number };

/** A figure that moved; what its causes leave over is their interplay. */
export type MovedFigure = FigureRow & {
  readonly first: number;
  readonly second: number;
  readonly by: readonly Share[];
  readonly interplay: number;
};

/** A point that moved, and the measures by how far each alone moves it, farthest first. */
export type MovedPoint = PointMove & { readonly by: readonly Share[] };

/** What came of a new card. */
export type Regrade = {
  readonly after: Drafted;
  readonly held: readonly HeldDepth[];
  readonly causes: readonly Cause[];
  readonly figures: readonly MovedFigure[];
  readonly points: readonly MovedPoint[];
};

/** Less than this is no move, mm: half of what the proof allows a seam. */
const still = 0.25;
/** The same for an area, mm²: a strip of that breadth a hand long. */
const stillArea = 50;

const everyMeasure: readonly MeasureKey[] = [...coreMeasures, ...furtherMeasures];

/** The card with one measure as another card has it, taken or not. */
function withOne(card: MeasureCard, measure: MeasureKey, other: MeasureCard): MeasureCard {
  const { [measure]: _, ...rest } = card;
  const value = other[measure];
  return asCard(value === undefined ? rest : { ...rest, [measure]: value });
}

/** A core measure stands on both cards, so only its value has changed. */
const asCard = (card: Partial<MeasureCard>): MeasureCard => card as MeasureCard;

function alone(before: Drafted, cause: Cause, card: MeasureCard, depths: Depths): Drafted | Cause {
  try {
    return draftAny(
      inputsOn(before, withOne(before.inputs.card, cause.measure, card), depths).inputs,
    );
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    return { ...cause, problems: error.problems };
  }
}

/** The measures that differ between two cards, in the order of the card. */
export const changedMeasures = (before: MeasureCard, after: MeasureCard): readonly Cause[] =>
  everyMeasure
    .filter((measure) => before[measure] !== after[measure])
    .map((measure) => {
      const [from, to] = [before[measure], after[measure]];
      return {
        measure,
        ...(from === undefined ? {} : { from }),
        ...(to === undefined ? {} : { to }),
      };
    });

type Trial = { readonly measure: MeasureKey; readonly draft: Drafted };

function movedFigures(before: Drafted, after: Drafted, trials: readonly Trial[]): MovedFigure[] {
  const there = trials.map(({ measure, draft }) => ({
    measure,
    values: new Map(figuresOf(draft).map((each) => [each.key, each.value])),
  }));
  return figureRows(before, after).flatMap(({ first, second, ...row }) => {
    if (first === undefined || second === undefined) return [];
    const least = row.kind === 'area' ? stillArea : still;
    if (Math.abs(second - first) < least) return [];
    const by = there
      .map(({ measure, values }) => ({ measure, change: (values.get(row.key) ?? first) - first }))
      .filter(({ change }) => Math.abs(change) > 1e-6)
      .toSorted((a, b) => Math.abs(b.change) - Math.abs(a.change));
    const told = by.reduce((sum, each) => sum + each.change, 0);
    return [{ ...row, first, second, by, interplay: second - first - told }];
  });
}

const reach = ({ from, to }: PointMove): number => Math.hypot(to.x - from.x, to.y - from.y);

function movedPoints(
  before: Drafted,
  after: Drafted,
  trials: readonly Trial[],
  align: Alignment,
): MovedPoint[] {
  const there = trials.map(({ measure, draft }) => ({
    measure,
    moves: new Map(pointMoves(before, draft, align).map((each) => [each.key, reach(each)])),
  }));
  return pointMoves(before, after, align)
    .filter((move) => reach(move) >= still)
    .map((move) => ({
      ...move,
      by: there
        .map(({ measure, moves }) => ({ measure, change: moves.get(move.key) ?? 0 }))
        .filter(({ change }) => change >= still)
        .toSorted((a, b) => b.change - a.change),
    }));
}

/**
 * Drafts the same garment for a new card and tells what moved, by how much, and which measure moved it:
 * each measure is changed alone and drafted; what they do not explain together is their interplay.
 * @throws DraftingError where the garment cannot be drawn for the new card.
 */
export function regradeTo(
  before: Drafted,
  card: MeasureCard,
  depths: Depths,
  align: Alignment,
): Regrade {
  const { inputs, held } = inputsOn(before, card, depths);
  const after = draftAny(inputs);
  const tried = changedMeasures(before.inputs.card, card).map((cause) => ({
    cause,
    made: alone(before, cause, card, depths),
  }));
  const trials = tried.flatMap(({ cause, made }): readonly Trial[] =>
    'pieces' in made ? [{ measure: cause.measure, draft: made }] : [],
  );
  return {
    after,
    held,
    causes: tried.map(({ cause, made }) => ('pieces' in made ? cause : made)),
    figures: movedFigures(before, after, trials),
    points: movedPoints(before, after, trials, align),
  };
}
