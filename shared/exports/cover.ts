import type { Draft } from '../engine/draft.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { Selection } from '../sheets/selection.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Unit } from '../units/said.ts';
import { speak } from '../units/speak.ts';
import { assembly, cuttingCautions } from './cautions.ts';
import { heading, measureList, pieceList } from './cover-lists.ts';
import { dayInWords } from './day.ts';
import type { Mark } from './drawing.ts';
import { box, pens, words } from './marks.ts';
import { pagePlan } from './page-plan.ts';
import { rod } from './rod.ts';
import { type Block, paragraph, stack } from './text-block.ts';
import { shorten } from './type-width.ts';
import { warningWords } from './warning-words.ts';

/** Where the two squares stand on the cover, mm: the print tests measure them there. */
export const testSquares = {
  metric: { x: 10, y: 40, side: 100 },
  inch: { x: 10, y: 144, side: 101.6 },
} as const;

export const selectionTitles: { readonly [S in Selection]: string } = {
  'bodice-toile': 'Bodice toile',
  'whole-gown': 'Whole gown',
};

const body = 3.4;

/** Whose draft this is, in one line. */
export const draftLine = (draft: Draft): string =>
  [
    draft.inputs.card.name ?? '',
    draft.inputs.card.date === undefined ? '' : `measured ${dayInWords(draft.inputs.card.date)}`,
    `draft ${draft.number}`,
  ]
    .filter((each) => each !== '')
    .join(' · ');

function squares(draft: Draft, unit: Unit, sheets: SheetPlan, pieces: readonly FinishedPiece[]) {
  const { metric, inch } = testSquares;
  const inner = inch.x + 6;
  const room = inch.side - 12;
  const said = speak(draft.walking.said, unit);
  return [
    box(pens.frame, metric.x, metric.y, metric.side, metric.side),
    words('100 mm square', metric.x + 6, metric.y + metric.side - 3, 4, { heavy: true }),
    words('measure both ways', metric.x + metric.side - 6, metric.y + metric.side - 3, 3, {
      anchor: 'end',
      grey: 0.3,
    }),
    ...pagePlan(sheets, pieces, {
      x: metric.x + 6,
      y: metric.y + 6,
      width: metric.side - 12,
      height: metric.side - 16,
    }),
    box(pens.frame, inch.x, inch.y, inch.side, inch.side),
    words('4 in square', inner, inch.y + inch.side - 3, 4, { heavy: true }),
    words('measure both ways', inch.x + inch.side - 6, inch.y + inch.side - 3, 3, {
      anchor: 'end',
      grey: 0.3,
    }),
    ...stack(
      [
        (y) => heading('Putting the sheets together', inner, y, room),
        ...assembly.map(
          (each, i) => (y: number) => paragraph(`${i + 1}  ${each}`, inner, y, room, body),
        ),
        (y) => heading('Walking', inner, y + 2, room),
        (y) => paragraph(draft.walking.caution ? `Caution: ${said}` : said, inner, y, room, body),
        (y) => heading('Sews together?', inner, y + 2, room),
        (y) => paragraph(speak(draft.proof.verdict, unit), inner, y, room, body),
      ],
      inch.y + 5,
      1.2,
    ).marks,
  ];
}

/** What to cut, from which measures, and what the maker was warned of; between two heights where it fits. */
function listsBeside(
  draft: Draft,
  pieces: readonly FinishedPiece[],
  unit: Unit,
  { x, width }: { readonly x: number; readonly width: number },
): readonly Mark[] {
  const { metric, inch } = testSquares;
  const note = 'est. = estimated, not taken on the body: measure it when you can.';
  const lists = (columns: 1 | 2): Block =>
    stack(
      [
        (y) => heading('Pieces', x, y, width),
        (y) => pieceList(pieces, x, y, width),
        (y) => heading(`Measures, ${unit}`, x, y + 3, width),
        (y) => measureList(draft, unit, columns, { x, y, width }),
        (y) => paragraph(note, x, y, width, 2.8, { grey: 0.3 }),
        ...draft.warnings.map(
          (each) => (y: number) => paragraph(warningWords(each, unit), x, y, width, 2.8),
        ),
      ],
      metric.y,
      1.2,
    );
  const foot = inch.y + inch.side;
  const roomy = lists(1);
  return roomy.next <= foot ? roomy.marks : lists(2).marks.filter((each) => reaches(each, foot));
}

/** Whether lettering stands above a height; many warnings may run on, and the table shows them all. */
const reaches = (mark: Mark, foot: number): boolean => mark.kind !== 'words' || mark.at.y <= foot;

/** The first sheet: what this is, whether it was printed true, which sheets follow and what to mind. */
export function coverPage(
  draft: Draft,
  sheets: SheetPlan,
  pieces: readonly FinishedPiece[],
  { selection, unit }: { readonly selection: Selection; readonly unit: Unit },
): readonly Mark[] {
  const { paper, tiles } = sheets.plan;
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const { inch } = testSquares;
  const aside = inch.x + inch.side + 6;
  const count = `${tiles.length + 1} sheets of ${paper.name}, this one counted`;
  return [
    ...rod(left, printerMargin, width, unit),
    words(selectionTitles[selection], left, 25, 9, { heavy: true }),
    words('Ellwand', left + width, 25, 6, { anchor: 'end', heavy: true, grey: 0.3 }),
    words(shorten(draftLine(draft), 3.6, width), left, 30.5, 3.6),
    words('Print at 100 %, no fit to page.', left, 35.6, 4, { heavy: true }),
    words(count, left + width, 35.6, 3.6, { anchor: 'end' }),
    ...squares(draft, unit, sheets, pieces),
    ...listsBeside(draft, pieces, unit, { x: aside, width: left + width - aside }),
    ...paragraph(cuttingCautions, left, inch.y + inch.side + 4, width, 3.2).marks,
  ];
}
