import type { Dart, Edge, FinishedPiece, InnerLine, LevelLine } from '../drafting/piece.ts';
import { endOf, reverse, startOf } from '../geometry/curve.ts';
import { type Path, line } from '../geometry/path.ts';
import { type Point, add, distance, scale, subtract, turnRight, unit } from '../geometry/point.ts';
import { pathData } from './path-data.ts';
import { element, escapeXml, figure } from './xml.ts';

const ink = '#1E2A32';
const slate = '#5B6A72';

/** Pens by trade convention: told apart by weight and dashes, never by colour alone. */
const pen = (width: number, stroke = ink, dash?: string): Record<string, string | undefined> => ({
  fill: 'none',
  stroke,
  'stroke-width': String(width),
  'stroke-dasharray': dash,
});

/** Keeps lettering legible where a level runs under it. */
const halo = { stroke: '#FFFFFF', 'stroke-width': '1', 'paint-order': 'stroke' };

const chain = (...points: readonly Point[]): Path =>
  points.slice(1).map((to, index) => line(points[index] ?? to, to));

function joinsOf(edge: Edge): string | undefined {
  if (edge.joins === undefined || edge.joins === 'self') return edge.joins;
  return `${edge.joins.piece}:${edge.joins.edge}`;
}

const seamLine = (edge: Edge): string =>
  element('path', {
    class: 'seam-line',
    'data-edge': edge.name,
    'data-kind': edge.kind,
    'data-joins': joinsOf(edge),
    'data-ease': edge.joins === undefined ? undefined : (edge.ease ?? 0),
    'data-ease-between': edge.easeBetween?.join(','),
    'data-ratio': edge.ratio,
    'data-corner': edge.corner,
    'data-fold': edge.kind === 'fold' ? 'true' : undefined,
    'data-open': edge.open ? 'true' : undefined,
    d: pathData(edge.path),
    ...pen(0.35, ink, edge.kind === 'fold' ? '3 9' : '4 2'),
  });

const dartOutline = (dart: Dart): string =>
  element('path', {
    class: 'dart',
    'data-dart': dart.name,
    'data-tip': dart.tip,
    'data-legs': 'side-leg,centre-leg',
    'data-mouth': dart.mouth,
    d: pathData([...dart.sideLeg, ...reverse(dart.centreLeg)], true),
    ...pen(0.25),
  });

const levelLine = ({ level, from, to }: LevelLine): string =>
  element(
    'path',
    { class: 'level', 'data-level': level, d: pathData(chain(from, to)), ...pen(0.15, slate) },
    `<title>${escapeXml(level.replace('-', ' '))}</title>`,
  );

/** An open arrowhead with its tip at `tip`, pointing along `way`. */
function arrowhead(tip: Point, way: Point): Path {
  const back = subtract(tip, scale(way, 5));
  const half = scale(turnRight(way), 2);
  return chain(add(back, half), tip, subtract(back, half));
}

function grainLine({ from, to }: FinishedPiece['grain']): string {
  const way = unit(subtract(to, from));
  const heads = [arrowhead(to, way), arrowhead(from, scale(way, -1))].map((each) => pathData(each));
  return (
    element('path', { class: 'grain', d: pathData(chain(from, to)), ...pen(0.3) }) +
    element('path', { class: 'grain-heads', d: heads.join(''), ...pen(0.3) })
  );
}

/** A bracket inside a fold, its two arrows on the fold. */
function foldBracket(edge: Edge): string {
  const [start, end] = [startOf(edge.path), endOf(edge.path)];
  if (!start || !end) return '';
  const way = unit(subtract(end, start));
  const inward = turnRight(way);
  const short = Math.min(40, distance(start, end) / 5);
  const [a, b] = [add(start, scale(way, short)), subtract(end, scale(way, short))];
  const inner = [a, b].map((each) => add(each, scale(inward, 12)));
  const bracket = pathData(chain(a, ...inner, b));
  const heads = [a, b].map((each) => pathData(arrowhead(each, scale(inward, -1))));
  return element('path', { class: 'fold-bracket', d: [bracket, ...heads].join(''), ...pen(0.3) });
}

/** Lines inside a piece, told apart by their strokes: bones dashed long, folds dotted, places to lay them on plain. */
const innerDashes: { readonly [K in InnerLine['kind']]: string | undefined } = {
  boning: '12 4',
  'pleat-fold': '2 3',
  'pleat-place': undefined,
  stay: '8 3 2 3',
  stitching: '4 2',
};

const innerLine = ({ name, kind, path }: InnerLine): string =>
  element('path', {
    class: 'inner-line',
    'data-line': name,
    'data-kind': kind,
    d: pathData(path),
    ...pen(0.25, ink, innerDashes[kind]),
  });

const drillPoint = ({ x, y }: Point): string =>
  element('circle', { class: 'drill', cx: x, cy: y, r: 1.5, ...pen(0.25) });

/** One piece of the SVG contract (method section 11), in its own coordinates under one shift. */
export function pieceSvg(piece: FinishedPiece, translate: Point): string {
  const marks = [
    element('path', { class: 'cut-line', d: pathData(piece.cutLine, true), ...pen(0.6) }),
    ...piece.edges.map(seamLine),
    ...piece.darts.map(dartOutline),
    ...piece.levels.map(levelLine),
    grainLine(piece.grain),
    ...piece.edges.filter((edge) => edge.kind === 'fold').map(foldBracket),
    ...piece.notchMarks.map((notch) =>
      element('path', {
        class: 'notch',
        'data-notch': notch.name,
        'data-edge': notch.edge,
        d: notch.strokes.map((stroke) => pathData([stroke])).join(''),
        ...pen(0.4),
      }),
    ),
    ...(piece.lines ?? []).map(innerLine),
    ...piece.drills.map(drillPoint),
    ...piece.lettering.map(({ text, at, size }) =>
      element('text', { x: at.x, y: at.y, 'font-size': size, fill: ink, ...halo }, escapeXml(text)),
    ),
  ];
  return element(
    'g',
    {
      class: 'piece',
      'data-piece': piece.name,
      'data-side': piece.side,
      'data-part': piece.part,
      'data-cloth': piece.cloth,
      'data-cut': piece.cut.replace(/^cut /, ''),
      'data-copies': piece.copies,
      transform: `translate(${figure(translate.x)} ${figure(translate.y)})`,
    },
    `\n${marks.filter((mark) => mark !== '').join('\n')}\n`,
  );
}
