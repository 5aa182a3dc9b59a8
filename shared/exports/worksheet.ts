import type { Drafted } from '../engine/drafted.ts';
import { contents } from '../lesson/contents.ts';
import type { Step } from '../drafting/step.ts';
import { type Paper, type PaperName, papers } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Said, Unit } from '../units/said.ts';
import { speak } from '../units/speak.ts';
import { cuttingCautions } from './cautions.ts';
import { draftLine } from './cover.ts';
import type { Mark, PrintJob } from './drawing.ts';
import { garmentTitles } from './garment-titles.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import { paragraph, stack } from './text-block.ts';
import { shorten } from './type-width.ts';
import { worksheetFigure } from './worksheet-figure.ts';

export type WorksheetChoice = { readonly paper: PaperName; readonly unit: Unit };

/** The figure of a step, and the white about it, mm. */
const figure = { width: 70, height: 46 } as const;
const gutter = 6;
const between = 4;
/** Under the head of a page, and above its foot. */
const top = 24;
const foot = 12;
/** A part's heading with the white above the first figure. */
const headingHeight = 9;

/** Something that stands in one place of a page: it says how high it is, and draws itself at a height. */
type Item = { readonly height: number; readonly draw: (y: number) => readonly Mark[] };

/** A sentence in which no number is parted from its unit at the end of a line. */
const held = (sentence: Said, unit: Unit): string =>
  speak(sentence, unit).replace(/(\d) (?=(?:cm|in)(?!\p{L}))/gu, '$1\u00a0');

function stepItem(
  draft: Drafted,
  step: Step,
  place: number,
  left: number,
  width: number,
  unit: Unit,
): Item {
  const x = left + figure.width + gutter;
  const room = width - figure.width - gutter;
  const text = (y: number) =>
    stack(
      [
        (at) => paragraph(`${place + 1}  ${step.title}`, x, at, room, 4.2, { heavy: true }),
        (at) => paragraph(held(step.said, unit), x, at, room, 3.5),
        ...(step.why === undefined
          ? []
          : [
              (at: number) =>
                paragraph(`Why: ${held(step.why ?? [], unit)}`, x, at, room, 3.1, { grey: 0.3 }),
            ]),
      ],
      y,
      1.4,
    );
  return {
    height: Math.max(figure.height, text(0).next),
    draw: (y) => [...worksheetFigure(draft, place, { x: left, y, ...figure }), ...text(y).marks],
  };
}

const headingItem = (part: string, left: number, width: number): Item => ({
  height: headingHeight,
  draw: (y) => [
    words(part, left, y + 5, 5, { heavy: true }),
    strokes(pens.hairline, stroke(left, y + 6.6, left + width, y + 6.6)),
  ],
});

/** Items of one part that must not be parted: a heading goes with the step under it. */
function itemsOf(
  draft: Drafted,
  left: number,
  width: number,
  unit: Unit,
): readonly (readonly Item[])[] {
  return contents(draft.steps).flatMap(({ part, from, steps }) =>
    steps.map((step, index) => {
      const item = stepItem(draft, step, from + index, left, width, unit);
      return index === 0 ? [headingItem(part, left, width), item] : [item];
    }),
  );
}

const heightOf = (group: readonly Item[]): number =>
  group.reduce((sum, { height }) => sum + height, 0) + between * (group.length - 1);

/** Groups down the pages, each as a whole; a group never begins where it does not fit. */
function paged(
  groups: readonly (readonly Item[])[],
  from: number,
  until: number,
): readonly (readonly Mark[])[] {
  const pages: Mark[][] = [[]];
  let y = from;
  for (const group of groups) {
    if (y > from && y + heightOf(group) > until) {
      pages.push([]);
      y = from;
    }
    for (const { height, draw } of group) {
      pages.at(-1)?.push(...draw(y));
      y += height + between;
    }
  }
  return pages;
}

function furniture(draft: Drafted, paper: Paper, page: number, pages: number): readonly Mark[] {
  const left = printerMargin;
  const right = paper.width - printerMargin;
  const bottom = paper.height - printerMargin;
  const line = shorten(draftLine(draft), 3.2, right - left - 30);
  return [
    words(
      `Worksheet: ${garmentTitles[draft.garment].toLowerCase()}, step by step`,
      left,
      printerMargin + 5,
      5.4,
      { heavy: true },
    ),
    words('Ellwand', right, printerMargin + 5, 5, { anchor: 'end', heavy: true, grey: 0.3 }),
    words(line, left, printerMargin + 10, 3.2),
    words(`page ${page} of ${pages}`, right, printerMargin + 10, 3.2, { anchor: 'end' }),
    words(
      'Bold: new in this step. Thin: there before. Figures are not to one scale; every number is full size.',
      left,
      bottom - 0.6,
      2.9,
      { grey: 0.3 },
    ),
  ];
}

/** What to mind before anything is cut, after the last step. */
const cautionItem = (left: number, width: number): Item => {
  const text = (y: number) => paragraph(cuttingCautions, left, y + 2, width, 2.9, { grey: 0.2 });
  return { height: text(0).next, draw: (y) => text(y).marks };
};

/** A learner's worksheet: every step with its figure, its sentence with this body's numbers, and why. */
export function worksheetJob(draft: Drafted, { paper: name, unit }: WorksheetChoice): PrintJob {
  const paper = papers[name];
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const groups = [...itemsOf(draft, left, width, unit), [cautionItem(left, width)]];
  const pages = paged(groups, top, paper.height - foot - 4);
  return {
    title: `Ellwand worksheet, draft ${draft.number}`,
    ...(draft.inputs.card.date === undefined ? {} : { date: draft.inputs.card.date }),
    paper,
    drawings: [],
    pages: pages.map((marks, index) => [
      ...furniture(draft, paper, index + 1, pages.length),
      ...marks,
    ]),
  };
}
