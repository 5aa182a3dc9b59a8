import { checkCard } from '../body/check-card.ts';
import type { Body } from '../body/card.ts';
import { completeCard } from '../body/complete-card.ts';
import { withReasons } from '../body/overrule.ts';
import { checkRules } from '../drafting/check-rules.ts';
import type { Construction } from '../drafting/construction.ts';
import { DraftingError } from '../drafting/drafting-error.ts';
import { openTable } from '../drafting/drafting-table.ts';
import { drawGown } from '../drafts/gown/draw-gown.ts';
import { gownLevels } from '../drafts/gown/levels.ts';
import { resolveStyle, withHouseDrop } from '../drafts/gown/resolve-style.ts';
import type { GownStyle } from '../drafts/gown/style-card.ts';
import { checkStyle } from '../drafts/gown/style-check.ts';
import { finishPiece } from '../finishing/finish-piece.ts';
import { prove } from '../proof/prove.ts';
import type { Problem } from '../units/problem.ts';
import { said } from '../units/said.ts';
import type { Draft, DraftInputs } from './draft.ts';
import { draftNumber } from './draft-number.ts';
import { sortedJson } from './sorted-json.ts';
import { labelFacts } from './label-facts.ts';
import { narrateFinishing } from './narrate-finishing.ts';

/** Version of the drafting rules: a saved gown keeps it, a change of any shape raises it. */
export const engineVersion = '1.0.0';

const errorsOf = (problems: readonly Problem[]): readonly Problem[] =>
  problems.filter((problem) => problem.severity === 'error');

function refuse(problems: readonly Problem[]): void {
  const errors = errorsOf(problems);
  if (errors.length > 0) throw new DraftingError(errors);
}

/** The body as drawn: where nobody measured the waist seam, its girth is the one the draft came to. */
function withDrawnSeam(body: Body, { wanted }: Construction, { waistSeam }: GownStyle): Body {
  if (waistSeam !== 'raised') return body;
  const seam = wanted.find(({ level }) => level === 'waist-seam')?.body;
  if (seam === undefined || !('waistSeamGirth' in body.estimated)) return body;
  return { ...body, measures: { ...body.measures, waistSeamGirth: seam } };
}

/**
 * Drafts a gown: checks the three inputs, draws on a clean table, finishes the pieces and proves
 * them. Pure: the same inputs give the same draft, byte for byte.
 * @throws DraftingError where the inputs are outside their limits; its problems name the fields.
 */
export function draftGown(inputs: DraftInputs): Draft {
  const { card, style, rules } = inputs;
  const aboutCard = checkCard(card);
  refuse([...aboutCard, ...checkRules(rules)]);
  const body = completeCard(card);
  const table = openTable();
  const levels = gownLevels(table, body);
  const dropped = withHouseDrop(style, body, levels, rules);
  const aboutStyle = checkStyle(dropped, body, levels);
  refuse(aboutStyle);
  const resolved = resolveStyle(dropped, body, levels);
  const drawn = drawGown(table, body, levels, resolved, rules);
  const number = draftNumber(sortedJson([engineVersion, card, style, rules]));
  narrateFinishing(
    table,
    drawn.pieces,
    rules,
    said`Every girth and seam was drawn and proven on the seam line, so an allowance can never be counted twice.`,
  );
  const label = labelFacts('gown', card, number, rules);
  const pieces = drawn.pieces.map((piece) => finishPiece(piece, rules, label));
  return {
    garment: 'gown',
    engine: engineVersion,
    number,
    inputs,
    body: withDrawnSeam(body, drawn.construction, resolved),
    bodyLevels: levels,
    style: resolved,
    levels: drawn.levels,
    pieces,
    steps: table.steps,
    handles: drawn.handles,
    construction: drawn.construction,
    walking: drawn.walking,
    warnings: withReasons([...aboutCard, ...aboutStyle, ...table.warnings], card),
    proof: prove({ pieces, construction: drawn.construction, rules }),
  };
}
