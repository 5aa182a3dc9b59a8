import type { Comparison, PiecePair } from '../compare/compare-drafts.ts';
import { type LevelFigure, levelFigures } from '../compare/level-figures.ts';
import { seamOutline } from '../compare/moved-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { reverse } from '../geometry/curve.ts';
import { type Region, hatch } from '../geometry/region.ts';
import type { Unit } from '../units/said.ts';
import { formatFigure } from './figure-words.ts';
import { levelTitles } from './level-titles.ts';
import { layStacks } from './overlaid.ts';
import { pathData } from './path-data.ts';
import { element, escapeXml, figure } from './xml.ts';

const ink = '#1E2A32';
const slate = '#5B6A72';

/** Strokes of the shading stand this far apart, mm. */
export const hatchApart = 3;

/** What two drafts over each other are called in legends. */
export type CompareNames = { readonly first: string; readonly second: string };

const pen = (width: number, dash?: string) => ({
  fill: 'none',
  stroke: ink,
  'stroke-width': String(width),
  'stroke-dasharray': dash,
});

/** Dart legs of a piece, from mouth to mouth. */
export const dartLines = (piece: FinishedPiece): string =>
  piece.darts
    .map(({ centreLeg, sideLeg }) => pathData([...centreLeg, ...reverse(sideLeg)]))
    .join('');

function outline(piece: FinishedPiece | undefined, which: 'first' | 'second'): string {
  if (!piece) return '';
  const look = which === 'first' ? pen(0.6) : pen(0.6, '7 3');
  return (
    element('path', { class: which, d: pathData(seamOutline(piece), true), ...look }) +
    element('path', {
      class: `${which}-darts`,
      d: dartLines(piece),
      ...pen(0.3, which === 'first' ? undefined : '4 2'),
    })
  );
}

/** A region as closed paths. */
export const regionData = (region: Region): string =>
  region.map((rim) => `M${rim.map(({ x, y }) => `${figure(x)} ${figure(y)}`).join('L')}Z`).join('');

function shading({ between }: PiecePair): string {
  if (!between) return '';
  const shade = (which: 'first' | 'second', way: 'rising' | 'falling') =>
    element('path', {
      class: `only-${which}`,
      d: regionData(between[which]),
      fill: '#D8D1C1',
      'fill-rule': 'evenodd',
    }) +
    element('path', {
      class: `only-${which}-strokes`,
      d: hatch(between[which], way, hatchApart)
        .map((each) => pathData([each]))
        .join(''),
      ...pen(0.35),
    });
  return shade('first', 'falling') + shade('second', 'rising');
}

/** A level's widths in both drafts, as they are written on it. */
export const levelWords = ({ level, first, second }: LevelFigure, unit: Unit): string =>
  `${levelTitles[level]} ${formatFigure('quarter', first, unit)} \u2192 ${formatFigure('quarter', second, unit)} ${unit}`;

const levelText = (each: LevelFigure, unit: Unit): string =>
  element(
    'text',
    {
      class: 'level-figure',
      'data-level': each.level,
      x: each.at.x - 4,
      y: each.at.y - 2,
      'font-size': 7,
      'text-anchor': 'end',
      fill: ink,
      stroke: '#FFFFFF',
      'stroke-width': '1.5',
      'paint-order': 'stroke',
    },
    escapeXml(levelWords(each, unit)),
  );

/** A drawing of its own size, one unit to the millimetre, with its title. */
export const svgSheet = (
  title: string,
  width: number,
  height: number,
  inside: readonly string[],
): string =>
  `<?xml version="1.0" encoding="UTF-8"?>\n${element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      width: `${Math.ceil(width)}mm`,
      height: `${Math.ceil(height)}mm`,
      viewBox: `0 0 ${Math.ceil(width)} ${Math.ceil(height)}`,
      'font-family': "'Source Sans 3', 'Helvetica Neue', Arial, sans-serif",
    },
    `\n<title>${escapeXml(title)}</title>\n${inside.join('\n')}\n`,
  )}\n`;

/** Lines of a legend under a drawing. */
export const legendLines = (lines: readonly string[], top: number): readonly string[] =>
  lines.map((text, k) =>
    element(
      'text',
      { class: 'legend', x: 20, y: top + 12 * (k + 1), 'font-size': 8, fill: slate },
      escapeXml(text),
    ),
  );

/**
 * Two drafts over each other as SVG, one unit to the millimetre: the first solid, the second dashed, what
 * only the one or the other has shaded at opposite slants, widths at the levels.
 */
export function compareSvg(comparison: Comparison, names: CompareNames, unit: Unit): string {
  const figures = levelFigures(comparison);
  const stacks = comparison.pairs.map((pair) => ({
    name: pair.name,
    pair,
    pieces: [pair.first, pair.second].flatMap((each) => each ?? []),
  }));
  const { placed, width, height } = layStacks(stacks);
  const groups = placed.map(({ stack: { pair }, translate }) =>
    element(
      'g',
      {
        class: 'pair',
        'data-piece': pair.name,
        transform: `translate(${figure(translate.x)} ${figure(translate.y)})`,
      },
      [
        `<title>${escapeXml(pair.title)}</title>`,
        shading(pair),
        outline(pair.first, 'first'),
        outline(pair.second, 'second'),
        ...figures.filter(({ piece }) => piece === pair.name).map((each) => levelText(each, unit)),
      ].join('\n'),
    ),
  );
  const legend = [
    `Solid: ${names.first}. Dashed: ${names.second}. Seam lines, without allowances; do not cut from this.`,
    'Strokes falling to the right: only in the solid one. Rising: only in the dashed one. Widths are those of a half, darts taken out.',
  ];
  return svgSheet(`${names.first} and ${names.second}`, width, height + 34, [
    ...groups,
    ...legendLines(legend, height),
  ]);
}
