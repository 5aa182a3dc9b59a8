import type { Drafted } from '../engine/drafted.ts';
import type { DrawnPiece } from '../sheets/drawn-pieces.ts';
import { squareSides } from '../sheets/scale-check.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { printedTiles } from '../sheets/tile-plan.ts';
import type { Unit } from '../units/said.ts';
import { speak } from '../units/speak.ts';
import { assemblyOf, cuttingCautions } from './cautions.ts';
import { heading, measureList, pieceList } from './cover-lists.ts';
import { dayInWords } from './day.ts';
import type { Mark } from './drawing.ts';
import { notToCut } from './line-style.ts';
import { box, pens, words } from './marks.ts';
import { pagePlan } from './page-plan.ts';
import { rod } from './rod.ts';
import { type Block, paragraph, stack } from './text-block.ts';
import { shorten } from './type-width.ts';
import { warningWords } from './warning-words.ts';

/** A page that a cover is drawn on, mm. */
export type CoverPage = {
  readonly width: number;
  readonly height: number;
  readonly margin: number;
};

/** A page lower than this has its squares side by side, mm. */
const lowPage = 275;

/** White between the squares to measure, mm. */
const betweenSquares = 4;

/** From the top of the printed area to the squares, mm: rod, title, whose it is, how to print. */
const headRoom = 30;

/** Where the two squares stand on a cover, mm: the print tests measure them there. */
export function testSquares({ height, margin }: CoverPage) {
  const [x, y] = [margin, margin + headRoom];
  const low = height < lowPage;
  return {
    metric: { x, y, side: squareSides.metric },
    inch: {
      x: low ? x + squareSides.metric + betweenSquares : x,
      y: low ? y : y + squareSides.metric + betweenSquares,
      side: squareSides.inch,
    },
  };
}

const body = 3.4;

/** Whose draft this is, in one line. */
export const draftLine = (draft: Pick<Drafted, 'inputs' | 'number'>): string =>
  [
    draft.inputs.card.name ?? '',
    draft.inputs.card.date === undefined ? '' : `measured ${dayInWords(draft.inputs.card.date)}`,
    `draft ${draft.number}`,
  ]
    .filter((each) => each !== '')
    .join(' · ');

const titles = {
  gown: { 'bodice-toile': 'Bodice toile', 'whole-gown': 'Whole gown', some: 'Some pieces' },
  'bodice-block': {
    'bodice-toile': 'Bodice block',
    'whole-gown': 'Bodice block',
    some: 'Some pieces',
  },
  'skirt-block': {
    'bodice-toile': 'Skirt block',
    'whole-gown': 'Skirt block',
    some: 'Some pieces',
  },
} as const;

/** What is printed, in two words. */
export const printTitle = (
  { garment }: Pick<Drafted, 'garment'>,
  { order }: Pick<SheetPlan, 'order'>,
): string => titles[garment][typeof order.pieces === 'string' ? order.pieces : 'some'];

/** What the seams and the walk come to: what the maker has to know before cutting. */
function findings(draft: Drafted, unit: Unit, x: number, room: number) {
  const walking =
    draft.garment === 'gown'
      ? [
          (y: number) => heading('Walking', x, y + 2, room),
          (y: number) => {
            const said = speak(draft.walking.said, unit);
            return paragraph(draft.walking.caution ? `Caution: ${said}` : said, x, y, room, body);
          },
        ]
      : [];
  return [
    ...walking,
    (y: number) => heading('Sews together?', x, y + 2, room),
    (y: number) => paragraph(speak(draft.proof.verdict, unit), x, y, room, body),
  ];
}

function squares(draft: Drafted, unit: Unit, sheets: SheetPlan, page: CoverPage) {
  const { metric, inch } = testSquares(page);
  const inner = inch.x + 6;
  const room = inch.side - 12;
  const named = (square: typeof metric | typeof inch, name: string): readonly Mark[] => [
    box(pens.frame, square.x, square.y, square.side, square.side),
    words(name, square.x + 6, square.y + square.side - 3, 4, { heavy: true }),
    words('measure both ways', square.x + square.side - 6, square.y + square.side - 3, 3, {
      anchor: 'end',
      grey: 0.3,
    }),
  ];
  return [
    ...named(metric, '100 mm square'),
    ...pagePlan(sheets, {
      x: metric.x + 6,
      y: metric.y + 6,
      width: metric.side - 12,
      height: metric.side - 16,
    }),
    ...named(inch, '4 in square'),
    ...stack(
      [
        (y) => heading('Putting the sheets together', inner, y, room),
        ...assemblyOf(sheets).map(
          (each, i) => (y: number) => paragraph(`${i + 1}  ${each}`, inner, y, room, body),
        ),
        ...findings(draft, unit, inner, room),
      ],
      inch.y + 5,
      1.2,
    ).marks,
  ];
}

type Column = { readonly x: number; readonly y: number; readonly width: number };

/** Sizes of the lists' letters, from the best to the smallest, mm. */
const listSizes = [3.1, 2.8, 2.5, 2.2] as const;

/** What to cut, from which measures, and what the maker was warned of; in letters that fit above `foot`. */
function listsBeside(
  draft: Drafted,
  drawn: readonly DrawnPiece[],
  unit: Unit,
  { x, y: top, width }: Column,
  { foot, numbered }: { readonly foot: number; readonly numbered: boolean },
): readonly Mark[] {
  const note = 'est. = estimated, not taken on the body: measure it when you can.';
  const pieces = drawn.map(({ piece: { title, cut }, copies }, i) => ({
    title: `${numbered ? `${i + 1}  ` : ''}${title}${copies === 1 ? '' : `, ${copies} times`}`,
    cut,
  }));
  const lists = (size: number, columns: 1 | 2): Block =>
    stack(
      [
        (y) => heading('Pieces', x, y, width),
        (y) => pieceList(pieces, { x, y, width }, size),
        (y) => heading(`Measures, ${unit}`, x, y + 3, width),
        (y) => measureList(draft, unit, columns, { x, y, width }, size),
        (y) => paragraph(note, x, y, width, Math.min(2.8, size), { grey: 0.3 }),
        ...draft.warnings.map(
          (each) => (y: number) =>
            paragraph(warningWords(each, unit), x, y, width, Math.min(2.8, size)),
        ),
      ],
      top,
      1.2,
    );
  const tries = listSizes.flatMap((size) => [
    lists(size, 1),
    ...(width > 62 ? [lists(size, 2)] : []),
  ]);
  const fits = tries.find(({ next }) => next <= foot);
  return fits ? fits.marks : (tries.at(-1)?.marks ?? []).filter((each) => reaches(each, foot));
}

/** Whether lettering stands above a height; many warnings may run on, and the table shows them all. */
const reaches = (mark: Mark, foot: number): boolean => mark.kind !== 'words' || mark.at.y <= foot;

/** `24 sheets of A4, this one counted`. */
function countLine({ cover, plan, sheets }: SheetPlan): string {
  const { paper } = plan;
  const left = plan.tiles.length - printedTiles(plan).length;
  const said = `${sheets} ${sheets === 1 ? 'sheet' : 'sheets'} of ${paper.name}`;
  const counted = cover === 'own sheet' ? ', this one counted' : '';
  const length = paper.roll ? `, ${Math.round(paper.height / 10)} cm long` : '';
  return `${said}${length}${counted}${left > 0 ? `, ${left} left out` : ''}`;
}

/** The first sheet: what this is, whether it was printed true, which sheets follow and what to mind. */
export function coverMarks(
  draft: Drafted,
  sheets: SheetPlan,
  drawn: readonly DrawnPiece[],
  unit: Unit,
  page: CoverPage,
): readonly Mark[] {
  const { margin: left } = page;
  const width = page.width - 2 * left;
  const { metric, inch } = testSquares(page);
  const aside = inch.x + inch.side + 6;
  const cautions = (y: number): Block => paragraph(cuttingCautions, left, y, width, 3.2);
  const low = page.height < lowPage;
  const foot = low
    ? page.height - left - (cautions(0).next + 3)
    : Math.max(inch.y + inch.side, page.height - left - 60);
  const small = notToCut(sheets.order);
  return [
    ...rod(left, left, width, unit),
    words(printTitle(draft, sheets), left, left + 15, 9, { heavy: true }),
    words('Ellwand', left + width, left + 15, 6, { anchor: 'end', heavy: true, grey: 0.3 }),
    words(shorten(draftLine(draft), 3.6, width), left, left + 20.5, 3.6),
    words(
      small === undefined
        ? 'Print at 100 %, no fit to page.'
        : `Print at 100 %. ${small[0]?.toUpperCase() ?? ''}${small.slice(1)}.`,
      left,
      left + 25.6,
      4,
      { heavy: true },
    ),
    words(countLine(sheets), left + width, left + 25.6, 3.6, { anchor: 'end' }),
    ...squares(draft, unit, sheets, page),
    ...listsBeside(
      draft,
      drawn,
      unit,
      { x: aside, y: metric.y, width: left + width - aside },
      { foot, numbered: small !== undefined },
    ),
    ...cautions(foot + 4).marks,
  ];
}
