import { type MeasureKey, coreMeasures, furtherMeasures } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { Drafted } from '../engine/drafted.ts';
import { formatAngle, formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import type { Mark } from './drawing.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import type { Block } from './text-block.ts';
import { shorten, typeWidth } from './type-width.ts';

/** Height of letters in a list, mm, and of its rows for a height of letters. */
const plainSize = 3.1;
const rowStep = (size: number): number => size * 1.48;

/** A list narrower than this has no room for a piece's name and what to cut of it on one line, mm. */
const narrow = 58;

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
  pieces: readonly Pick<FinishedPiece, 'title' | 'cut'>[],
  { x, y, width }: { readonly x: number; readonly y: number; readonly width: number },
  size = plainSize,
): Block {
  const rows = width < narrow ? 2 : 1;
  const step = rowStep(size);
  const marks = pieces.flatMap(({ title, cut }, i): Mark[] => {
    const line = y + step * rows * i + size;
    const room = rows === 2 ? width : width - typeWidth(cut, size) - 2;
    return [
      words(shorten(title, size, room), x, line, size),
      words(cut, x + width, line + (rows - 1) * step, size, { anchor: 'end', grey: 0.3 }),
    ];
  });
  return { marks, next: y + step * rows * pieces.length };
}

/** The measures the draft's steps used, in the order of the card; the core ten where no step says. */
function measuresUsed(draft: Drafted): readonly MeasureKey[] {
  const used = new Set(draft.steps.flatMap((each) => each.measures));
  return [...coreMeasures, ...furtherMeasures].filter(
    (key) => used.has(key) || coreMeasures.some((core) => core === key),
  );
}

const valueOf = (draft: Drafted, key: MeasureKey, unit: Unit): string =>
  measureGuide[key].kind === 'angle'
    ? formatAngle(draft.body.measures[key])
    : formatLength(draft.body.measures[key], unit);

/** The measures used, in one column or two; an estimate is marked `est.` before its value. */
export function measureList(
  draft: Drafted,
  unit: Unit,
  columns: 1 | 2,
  { x, y, width }: { readonly x: number; readonly y: number; readonly width: number },
  size = plainSize,
): Block {
  const keys = measuresUsed(draft);
  const rows = Math.ceil(keys.length / columns);
  const estimated: Readonly<Record<string, string | undefined>> = draft.body.estimated;
  const column = columns === 2 ? (width - 5) / 2 : width;
  const marks = keys.flatMap((key, i): Mark[] => {
    const at = x + (i < rows ? 0 : column + 5);
    const line = y + rowStep(size) * (i % rows) + size;
    const value = `${estimated[key] === undefined ? '' : 'est. '}${valueOf(draft, key, unit)}`;
    return [
      words(
        shorten(measureGuide[key].label, size, column - typeWidth(value, size) - 2),
        at,
        line,
        size,
      ),
      words(value, at + column, line, size, { anchor: 'end' }),
    ];
  });
  return { marks, next: y + rowStep(size) * rows };
}
