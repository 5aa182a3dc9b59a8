import { svgPathProperties } from 'svg-path-properties';
import { type Read, ofClass, readXml } from './svg-reader.ts';

/** A joined edge beside its partner: how far the two are apart after stated ease and gathering, mm. */
export type MeasuredEdge = {
  readonly piece: string;
  readonly edge: string;
  readonly joins: string;
  readonly length: number;
  /** Absent where the partner named is not in the file. */
  readonly partner?: number;
  readonly difference: number;
};

/** A whole-body girth, mm, of the pieces of one part; `waist edges` and `hem edges` are those seams' own length. */
export type MeasuredGirth = {
  readonly level: string;
  readonly part: string;
  readonly girth: number;
};

export type Remeasured = {
  readonly edges: readonly MeasuredEdge[];
  readonly girths: readonly MeasuredGirth[];
};

type At = { readonly x: number; readonly y: number };

const samplesInCurve = 64;

/** A drawn outline as points along it, from a general path library. */
function pointsAlong(d: string): readonly At[] {
  return new svgPathProperties(d).getParts().flatMap((part) => {
    const share = part.length / samplesInCurve;
    const inner = Array.from({ length: samplesInCurve }, (_, i) =>
      part.getPointAtLength(i * share),
    );
    return [...inner, part.end];
  });
}

/** Width in x that a closed outline takes out of the straight line from one place to another. */
function widthTaken(outline: readonly At[], from: At, to: At): number {
  const height = (p: At): number =>
    (to.x - from.x) * (p.y - from.y) - (to.y - from.y) * (p.x - from.x);
  const met: number[] = [];
  outline.forEach((p, index) => {
    const before = outline[(index + outline.length - 1) % outline.length] ?? p;
    const [a, b] = [height(before), height(p)];
    if (a <= 0 !== b <= 0) met.push(before.x + ((p.x - before.x) * a) / (a - b));
  });
  return met.length < 2 ? 0 : Math.max(...met) - Math.min(...met);
}

const number = (read: Read, attribute: string, otherwise: number): number =>
  read.attributes[attribute] === undefined ? otherwise : Number(read.attributes[attribute]);

const lengthOf = (read: Read): number =>
  new svgPathProperties(read.attributes.d ?? '').getTotalLength();

const partOf = (piece: string): string =>
  ['flare', 'godet', 'middle', 'top'].find((part) => piece.split('-').includes(part)) ?? 'whole';

/** Length at which an edge meets its partner: gathers drawn in, ease taken away. */
const sewn = (edge: Read): number =>
  lengthOf(edge) / number(edge, 'data-ratio', 1) - number(edge, 'data-ease', 0);

function measureEdges(pieces: readonly Read[]): readonly MeasuredEdge[] {
  const all = new Map<string, Read>();
  for (const piece of pieces) {
    for (const edge of ofClass(piece, 'seam-line')) {
      all.set(
        `${piece.attributes['data-piece'] ?? ''}:${edge.attributes['data-edge'] ?? ''}`,
        edge,
      );
    }
  }
  return [...all].flatMap(([name, edge]) => {
    const joins = edge.attributes['data-joins'];
    if (joins === undefined) return [];
    const [piece = '', own = ''] = name.split(':');
    const length = lengthOf(edge);
    const partner = joins === 'self' ? edge : all.get(joins);
    if (!partner) return [{ piece, edge: own, joins, length, difference: Infinity }];
    const difference = sewn(edge) - sewn(partner);
    return [{ piece, edge: own, joins, length, partner: lengthOf(partner), difference }];
  });
}

/** A level that a turned dart bends is drawn in stretches, each counted along itself; any other by its x-extent. */
function halfWidth(piece: Read, level: Read): number {
  const line = new svgPathProperties(level.attributes.d ?? '');
  const from = line.getPointAtLength(0);
  const to = line.getPointAtLength(line.getTotalLength());
  const name = level.attributes['data-level'];
  const stretches = ofClass(piece, 'level').filter(
    (each) => each.attributes['data-level'] === name,
  );
  if (stretches.length > 1) return line.getTotalLength();
  const taken = ofClass(piece, 'dart')
    .map((dart) => widthTaken(pointsAlong(dart.attributes.d ?? ''), from, to))
    .reduce((sum, width) => sum + width, 0);
  return Math.abs(to.x - from.x) - taken;
}

function measureGirths(pieces: readonly Read[]): readonly MeasuredGirth[] {
  const sums = new Map<string, MeasuredGirth>();
  const addHalf = (level: string, part: string, half: number): void => {
    const key = `${part} ${level}`;
    const before = sums.get(key)?.girth ?? 0;
    sums.set(key, { level, part, girth: before + 2 * half });
  };
  // What lies inside is no part of the gown's girth.
  for (const piece of pieces.filter(({ attributes }) => attributes['data-part'] !== 'inner')) {
    const part = partOf(piece.attributes['data-piece'] ?? '');
    for (const level of ofClass(piece, 'level')) {
      addHalf(level.attributes['data-level'] ?? '', part, halfWidth(piece, level));
    }
    for (const edge of ofClass(piece, 'seam-line')) {
      const waist = /^waist\b/.test(edge.attributes['data-edge'] ?? '');
      if (waist && edge.attributes['data-open'] === undefined) {
        addHalf('waist edges', part, lengthOf(edge));
      }
      if (edge.attributes['data-edge'] === 'hem') addHalf('hem edges', 'all', lengthOf(edge));
    }
  }
  return [...sums.values()];
}

/**
 * Edges and girths taken with a tape from the exported SVG alone: nothing here is shared with the
 * engine. Pieces on the fold are halves of the body, and so are pairs, so every half counts twice.
 */
export function remeasure(svg: string): Remeasured {
  const pieces = ofClass(readXml(svg), 'piece');
  return { edges: measureEdges(pieces), girths: measureGirths(pieces) };
}
