import type { Edge, Piece } from '../drafting/piece.ts';
import { endOf, pathCrossings, pathLength, startOf, startTangent } from '../geometry/curve.ts';
import { type Point, add, cross, distance, scale, subtract, unit } from '../geometry/point.ts';
import type { Unit } from '../units/said.ts';
import { type Row, chalked } from './chalk-rows.ts';

type Sector = {
  readonly title: string;
  readonly inner: number;
  readonly knee: number;
  readonly hem: number;
  readonly chord: number;
  /** Radius to the hem at even parts of the angle, from the edge nearer the centre. */
  readonly radii: readonly number[];
  /** How far the hem hangs below the straight line between its ends. */
  readonly hang: number;
};

/** Where two straight edges would meet, carried on; no answer for edges that run alike. */
export function meetingOf(one: Edge, other: Edge): Point | undefined {
  const [a, b] = [startOf(one.path), startOf(other.path)];
  const [along, across] = [startTangent(one.path), startTangent(other.path)];
  const turn = cross(along, across);
  if (!a || !b || Math.abs(turn) < 1e-9) return undefined;
  return add(a, scale(along, cross(subtract(b, a), across) / turn));
}

/** Quarters of the angle. */
const parts = [0, 0.25, 0.5, 0.75, 1];

/** A flare piece as it is struck with chalk on a string, from where its seams meet; no answer without a hem. */
function sectorOf(piece: Piece): readonly Sector[] {
  const at = piece.edges.findIndex((each) => each.kind === 'hem');
  const hem = piece.edges[at];
  const [far, near] = [piece.edges.at(at - 1), piece.edges.at((at + 1) % piece.edges.length)];
  const apex = far && near && meetingOf(far, near);
  const [from, to] = hem ? [startOf(hem.path), endOf(hem.path)] : [];
  const start = far && startOf(far.path);
  if (!hem || !apex || !from || !to || !start) return [];
  const [first, last] = [unit(subtract(to, apex)), unit(subtract(from, apex))];
  const radii = parts.map((part) => {
    const ray = unit(add(scale(first, 1 - part), scale(last, part)));
    const met = pathCrossings(hem.path, apex, add(apex, ray))[0]?.at;
    return distance(apex, met ?? (part < 0.5 ? to : from));
  });
  const chord = distance(from, to);
  return [
    {
      title: piece.title,
      inner: distance(apex, start),
      knee: piece.edges
        .filter((each) => each.name.startsWith('knee'))
        .reduce((sum, each) => sum + pathLength(each.path), 0),
      hem: pathLength(hem.path),
      chord,
      radii,
      hang: (radii[2] ?? 0) - Math.sqrt(Math.max(0, (radii[4] ?? 0) ** 2 - chord ** 2 / 4)),
    },
  ];
}

/** A row of one length under its name. */
export const pairIn =
  (unit: Unit) =>
  (name: string, mm: number): Row => ({ kind: 'pair', name, value: chalked(mm, unit) });

/** Radii that differ by less are one, mm. */
const same = 0.5;
/** No string is longer: a flatter arc is drawn from the straight line across its ends, mm. */
const longestString = 2000;

const alike = (a: Sector, b: Sector): boolean =>
  Math.abs(a.hem - b.hem) < 0.1 &&
  Math.abs(a.inner - b.inner) < 0.1 &&
  Math.abs((a.radii[0] ?? 0) - (b.radii[0] ?? 0)) < 0.1;

const isTrained = ({ radii }: Sector): boolean => Math.max(...radii) - Math.min(...radii) > same;

/** The two arcs, or for a godet its one. */
function struckRows(sector: Sector, unit: Unit): readonly Row[] {
  const pair = pairIn(unit);
  const outer = sector.radii[4] ?? 0;
  if (sector.inner < same) {
    return [
      { kind: 'heading', text: `Godets, from their point, ${unit}` },
      pair('sides, to the hem', outer),
    ];
  }
  return [
    { kind: 'heading', text: `Flare, struck from one point, ${unit}` },
    pair('radius to the knee seam', sector.inner),
    pair('length, knee to hem', outer - sector.inner),
    pair('radius to the hem', outer),
  ];
}

/** The hem of a piece: how far along its arcs, or its radii where it runs into a train. */
function hemRows(sector: Sector, unit: Unit): readonly Row[] {
  const pair = pairIn(unit);
  const trained: readonly Row[] = isTrained(sector)
    ? [
        pair('radius, inner edge', sector.radii[0] ?? 0),
        pair('a quarter round', sector.radii[1] ?? 0),
        pair('half round', sector.radii[2] ?? 0),
        pair('three quarters round', sector.radii[3] ?? 0),
      ]
    : [];
  return [
    ...(sector.knee > 0 ? [pair('along the knee seam', sector.knee)] : []),
    pair('along the hem', sector.hem),
    pair('straight across the hem', sector.chord),
    ...(sector.inner > longestString ? [pair('hem below that, half way', sector.hang)] : []),
    ...trained,
  ];
}

/** The flare: arcs struck from one point, then how far along them each piece goes. */
export function flareRows(pieces: readonly Piece[], unit: Unit): readonly Row[] {
  const sectors = pieces.flatMap(sectorOf);
  const different = sectors.filter(
    (each, i) => sectors.findIndex((other) => alike(each, other)) === i,
  );
  return different.flatMap((sector, i): readonly Row[] => {
    const before = different[i - 1];
    const struck =
      before &&
      Math.abs(before.inner - sector.inner) < 0.1 &&
      Math.abs((before.radii[4] ?? 0) - (sector.radii[4] ?? 0)) < 0.1;
    const titles = sectors
      .filter((each) => alike(each, sector))
      .map((each) => each.title.replace(/^(Flare|Godet), /, ''));
    return [
      ...(struck ? [] : struckRows(sector, unit)),
      { kind: 'note', text: titles.join('; ') },
      ...hemRows(sector, unit),
    ];
  });
}
