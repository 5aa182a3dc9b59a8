import type { Alignment } from '../compare/alignment.ts';
import { seamOutline } from '../compare/moved-piece.ts';
import { type Nest, sizeLabel } from '../regrade/nest.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import { dartLines, legendLines, svgSheet } from './compare-svg.ts';
import { type SizedPiece, nestStacks } from './nest-stacks.ts';
import { layStacks } from './overlaid.ts';
import { pathData } from './path-data.ts';
import { type SizePen, sizePens } from './size-pens.ts';
import { element, escapeXml, figure } from './xml.ts';

const ink = '#1E2A32';

const sizeGroup = (
  { step, label, piece, labelAt }: SizedPiece,
  { width, dash }: SizePen,
  cut: boolean,
): string => {
  const pen = {
    fill: 'none',
    stroke: ink,
    'stroke-width': String(width),
    'stroke-dasharray': dash?.join(' '),
  };
  return element(
    'g',
    { class: 'size', 'data-step': step, 'data-size': label },
    [
      element('path', {
        class: cut ? 'cut-line' : 'seam-line',
        d: pathData(cut ? piece.cutLine : seamOutline(piece), true),
        ...pen,
      }),
      element('path', { class: 'dart', d: dartLines(piece), ...pen }),
      element(
        'text',
        {
          x: labelAt.x,
          y: labelAt.y,
          'font-size': 6,
          'text-anchor': 'middle',
          fill: ink,
          stroke: '#FFFFFF',
          'stroke-width': '1.5',
          'paint-order': 'stroke',
        },
        escapeXml(label),
      ),
    ].join(''),
  );
};

/** What a nest is drawn with. */
export type NestLook = {
  readonly align: Alignment;
  /** The finished (seam) line of each size, or its cutting line. */
  readonly lines: 'finished' | 'cutting';
};

/** The sizes of a nest as a line of a legend: label and finished bust or hip. */
export function sizeWords({ sizes }: Nest, unit: Unit): string {
  const written = sizes.map(({ step, draft }) => {
    const { girths } = draft.proof;
    const girth = girths.find(({ level }) => level === 'bust') ?? girths.at(-1);
    return girth === undefined
      ? sizeLabel(step)
      : `${sizeLabel(step)}: ${girth.level.replace('-', ' ')} ${formatWithUnit(girth.pieces, unit)}`;
  });
  return `Finished, smallest first. ${written.join(' · ')}`;
}

/** A nest as SVG, one unit to the millimetre: a line style and a label for each size, sizes as groups. */
export function nestSvg(nest: Nest, { align, lines }: NestLook, unit: Unit): string {
  const pens = sizePens(nest.sizes.map(({ step }) => step));
  const { placed, width, height } = layStacks(nestStacks(nest, align));
  const groups = placed.map(({ stack, translate }) =>
    element(
      'g',
      {
        class: 'nested-piece',
        'data-piece': stack.name,
        transform: `translate(${figure(translate.x)} ${figure(translate.y)})`,
      },
      [
        `<title>${escapeXml(stack.title)}</title>`,
        ...stack.sized.map((each) =>
          sizeGroup(each, pens.get(each.step) ?? { width: 0.35 }, lines === 'cutting'),
        ),
      ].join('\n'),
    ),
  );
  const what =
    lines === 'cutting'
      ? 'Cutting lines, allowances added.'
      : 'Seam lines, without allowances; do not cut from this.';
  return svgSheet('Nest of sizes', width, height + 34, [
    ...groups,
    ...legendLines([what, sizeWords(nest, unit)], height),
  ]);
}
