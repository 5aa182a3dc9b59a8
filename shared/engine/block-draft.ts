import type { Body, MeasureCard } from '../body/card.ts';
import type { BodyLevels } from '../body/levels.ts';
import { checkCard } from '../body/check-card.ts';
import { completeCard } from '../body/complete-card.ts';
import { withReasons } from '../body/overrule.ts';
import { checkRules } from '../drafting/check-rules.ts';
import type { WantedGirth } from '../drafting/construction.ts';
import { DraftingError } from '../drafting/drafting-error.ts';
import { type DraftingTable, openTable } from '../drafting/drafting-table.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece, LevelName } from '../drafting/piece.ts';
import type { Step } from '../drafting/step.ts';
import type { DrawnBlock } from '../drafts/drawn-block.ts';
import { gownLevels } from '../drafts/gown/levels.ts';
import { finishPiece } from '../finishing/finish-piece.ts';
import type { Point } from '../geometry/point.ts';
import { proveBlock } from '../proof/prove-block.ts';
import type { Proof } from '../proof/proof.ts';
import type { Problem } from '../units/problem.ts';
import { said } from '../units/said.ts';
import { engineVersion } from './draft-gown.ts';
import { draftNumber } from './draft-number.ts';
import { sortedJson } from './sorted-json.ts';
import { labelFacts } from './label-facts.ts';
import { narrateFinishing } from './narrate-finishing.ts';

/** The garments that are blocks. */
export type BlockName = 'bodice-block' | 'skirt-block';

/** The three inputs of a block, and which it is. */
export type BlockInputs<Name extends BlockName, Card> = {
  readonly garment: Name;
  readonly card: MeasureCard;
  readonly style: Card;
  readonly rules: HouseRules;
};

/** A block drafted, finished and proven: of a gown's draft all that applies. */
export type BlockDraft<Name extends BlockName, Card, Style> = {
  readonly garment: Name;
  readonly engine: string;
  /** Short number printed on every piece, the same for the same inputs. */
  readonly number: string;
  readonly inputs: BlockInputs<Name, Card>;
  readonly body: Body;
  readonly bodyLevels: BodyLevels;
  readonly style: Style;
  /** y of the levels the block has, mm below the side neck point. */
  readonly levels: { readonly [L in LevelName]?: number };
  readonly pieces: readonly FinishedPiece[];
  readonly steps: readonly Step[];
  readonly wanted: readonly WantedGirth[];
  /** Where the bust dart turns, for a screen that moves it; absent on a skirt. */
  readonly bustPoint?: Point;
  readonly warnings: readonly Problem[];
  readonly proof: Proof;
};

/** How one kind of block is made; each of its own kind of style card. */
export type BlockKind<Name extends BlockName, Card, Style> = {
  readonly garment: Name;
  readonly check: (card: Card, body: Body, levels: BodyLevels) => readonly Problem[];
  readonly resolve: (card: Card, body: Body, levels: BodyLevels, rules: HouseRules) => Style;
  readonly draw: (
    table: DraftingTable,
    body: Body,
    levels: BodyLevels,
    style: Style,
    rules: HouseRules,
  ) => DrawnBlock;
};

function refuse(problems: readonly Problem[]): void {
  const errors = problems.filter((problem) => problem.severity === 'error');
  if (errors.length > 0) throw new DraftingError(errors);
}

/**
 * Drafts a block: checks the three inputs, draws on a clean table, finishes the pieces and proves them.
 * Pure: the same inputs give the same draft, byte for byte.
 * @throws DraftingError where the inputs are outside their limits; its problems name the fields.
 */
export function draftBlock<Name extends BlockName, Card, Style>(
  kind: BlockKind<Name, Card, Style>,
  { card, style, rules }: Omit<BlockInputs<Name, Card>, 'garment'>,
): BlockDraft<Name, Card, Style> {
  const { garment } = kind;
  const aboutCard = checkCard(card);
  refuse([...aboutCard, ...checkRules(rules)]);
  const body = completeCard(card);
  const table = openTable();
  const bodyLevels = gownLevels(table, body);
  const aboutStyle = kind.check(style, body, bodyLevels);
  refuse(aboutStyle);
  const resolved = kind.resolve(style, body, bodyLevels, rules);
  const drawn = kind.draw(table, body, bodyLevels, resolved, rules);
  const number = draftNumber(sortedJson([garment, engineVersion, card, style, rules]));
  narrateFinishing(
    table,
    drawn.pieces,
    rules,
    said`A block is kept as its seam line: trace that to design from it.`,
  );
  const label = labelFacts(garment, card, number, rules);
  const pieces = drawn.pieces.map((piece) => finishPiece(piece, rules, label));
  return {
    garment,
    engine: engineVersion,
    number,
    inputs: { garment, card, style, rules },
    body,
    bodyLevels,
    style: resolved,
    levels: drawn.levels,
    pieces,
    steps: table.steps,
    wanted: drawn.wanted,
    ...(drawn.bustPoint && { bustPoint: drawn.bustPoint }),
    warnings: withReasons([...aboutCard, ...aboutStyle, ...table.warnings], card),
    proof: proveBlock({ pieces, wanted: drawn.wanted, rules }),
  };
}
