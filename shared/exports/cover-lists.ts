import { type MeasureKey, coreMeasures, furtherMeasures } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { Draft } from '../engine/draft.ts';
import { formatAngle, formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import type { Mark } from './drawing.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import type { Block } from './text-block.ts';
import { shorten } from './type-width.ts';

const rowSize = 3.1;
const rowStep = 4.6;

/** A heading with a hairline under it. */
export const heading = (text: string, x: number, y: number, width: number): Block => ({
  marks: [
    words(text, x, y + 3.4, 4, { heavy: true }),
    strokes(pens.hairline, stroke(x, y + 5, x + width, y + 5)),
  ],
  next: y + 6,
});

/** The pieces on these sheets, each with what to cut of it. */
export function pieceList(
  pieces: readonly FinishedPiece[],
  x: number,
  y: number,
  width: number,
): Block {
  const marks = pieces.flatMap((each, i): Mark[] => {
    const line = y + rowStep * i + rowSize;
    return [
      words(shorten(each.title, rowSize, width - 30), x, line, rowSize),
      words(each.cut, x + width, line, rowSize, { anchor: 'end', grey: 0.3 }),
    ];
  });
  return { marks, next: y + rowStep * pieces.length };
}

/** The measures the draft's steps used, in the order of the card; the core ten where no step says. */
function measuresUsed(draft: Draft): readonly MeasureKey[] {
  const used = new Set(draft.steps.flatMap((each) => each.measures));
  return [...coreMeasures, ...furtherMeasures].filter(
    (key) => used.has(key) || coreMeasures.some((core) => core === key),
  );
}

const valueOf = (draft: Draft, key: MeasureKey, unit: Unit): string =>
  measureGuide[key].kind === 'angle'
    ? formatAngle(draft.body.measures[key])
    : formatLength(draft.body.measures[key], unit);

/** The measures used, in one column or two; an estimate is marked `est.` before its value. */
export function measureList(
  draft: Draft,
  unit: Unit,
  columns: 1 | 2,
  { x, y, width }: { readonly x: number; readonly y: number; readonly width: number },
): Block {
  const keys = measuresUsed(draft);
  const rows = Math.ceil(keys.length / columns);
  const estimated: Readonly<Record<string, string | undefined>> = draft.body.estimated;
  const column = columns === 2 ? (width - 5) / 2 : width;
  const marks = keys.flatMap((key, i): Mark[] => {
    const at = x + (i < rows ? 0 : column + 5);
    const line = y + rowStep * (i % rows) + rowSize;
    const value = `${estimated[key] === undefined ? '' : 'est. '}${valueOf(draft, key, unit)}`;
    return [
      words(shorten(measureGuide[key].label, rowSize, column - 18), at, line, rowSize),
      words(value, at + column, line, rowSize, { anchor: 'end' }),
    ];
  });
  return { marks, next: y + rowStep * rows };
}
