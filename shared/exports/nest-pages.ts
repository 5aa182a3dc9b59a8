import { seamOutline } from '../compare/moved-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { reverse } from '../geometry/curve.ts';
import type { NestReport } from '../regrade/nest-report.ts';
import { type Nest, sizeLabel } from '../regrade/nest.ts';
import { papers } from '../sheets/papers.ts';
import type { Unit } from '../units/said.ts';
import type { Mark, PrintJob } from './drawing.ts';
import { formatFigure } from './figure-words.ts';
import { type KeyTable, keyPage, tablePages } from './key-page.ts';
import { levelTitles } from './level-titles.ts';
import { outline, strokes, words } from './marks.ts';
import { type NestStack, nestStacks } from './nest-stacks.ts';
import { type NestLook, sizeWords } from './nest-svg.ts';
import { sizePens } from './size-pens.ts';
import { type StackPaper, scaleWords, stackPages } from './stack-pages.ts';

/** Name of a size's layer, as a viewer lists it. */
export const layerName = (step: number): string => `Size ${sizeLabel(step)}`;

const inWords = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

function reportTables(report: NestReport, nest: Nest, unit: Unit): readonly KeyTable[] {
  const titles = new Map(
    nest.sizes.flatMap(({ draft }) => draft.pieces.map(({ name, title }) => [name, title])),
  );
  return [
    {
      title: `Finished girths, ${unit}`,
      heads: nest.sizes.map(({ step }) => sizeLabel(step)),
      rows: report.girths.map(({ level, girths }) => [
        inWords(levelTitles[level]),
        ...nest.sizes.map(({ step }) => {
          const found = girths.find((each) => each.step === step);
          return found === undefined ? '\u2013' : formatFigure('girth', found.girth, unit);
        }),
      ]),
    },
    {
      title: 'Points off the straight line between smallest and largest',
      heads: ['size', `off, ${unit}`],
      rows: report.off.map(({ piece, title, step, off }) => [
        `${titles.get(piece) ?? piece}, ${title}`,
        sizeLabel(step),
        formatFigure('seam', off, unit),
      ]),
    },
  ];
}

/** What a nest is printed with. */
export type NestPrint = StackPaper &
  NestLook & { readonly report: NestReport; readonly unit: Unit };

/** A nest as pages: what the lines are, the report, then the pieces on sheets; a layer for each size. */
export function nestPages(nest: Nest, print: NestPrint): PrintJob {
  const { align, lines, report, unit, paper, scale } = print;
  const steps = nest.sizes.map(({ step }) => step);
  const pens = sizePens(steps);
  const stacks = nestStacks(nest, align);
  const draw = (
    { sized }: NestStack,
    scaled: (piece: FinishedPiece) => FinishedPiece,
  ): readonly Mark[] =>
    sized.map(({ step, label, piece, labelAt }): Mark => {
      const drawn = scaled(piece);
      const pen = pens.get(step) ?? { width: 0.35 };
      return {
        kind: 'layer',
        layer: layerName(step),
        marks: [
          outline(pen, lines === 'cutting' ? drawn.cutLine : seamOutline(drawn)),
          strokes(
            { ...pen, width: 0.25 },
            ...drawn.darts.map(({ centreLeg, sideLeg }) => [...centreLeg, ...reverse(sideLeg)]),
          ),
          words(label, labelAt.x * scale, labelAt.y * scale, 3, { anchor: 'middle', heavy: true }),
        ],
      };
    });
  const before = [
    keyPage(papers[paper], {
      title: 'Nest of sizes',
      said: [
        `${nest.sizes.length} sizes over each other, ${scaleWords(scale)}. ${
          lines === 'cutting'
            ? 'Cutting lines, allowances added.'
            : 'Seam lines, without allowances.'
        }`,
        sizeWords(nest, unit),
        'Each size lies in a layer of its own, which a viewer can show and hide.',
      ],
      lines: steps.map((step) => ({
        pen: pens.get(step) ?? { width: 0.35 },
        text: sizeLabel(step),
      })),
    }),
    ...tablePages(papers[paper], reportTables(report, nest, unit)),
  ];
  return stackPages(stacks, { paper, scale }, draw, {
    title: 'Ellwand, nest of sizes',
    legend: `nest of ${nest.sizes.length} sizes, ${scaleWords(scale)}`,
    before,
    layers: steps.map(layerName),
  });
}
