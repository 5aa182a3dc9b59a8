import { type CellSize, type Raster, cellsTaken } from './piece-raster.ts';
import { type Run, merged } from './runs.ts';
import {
  type Cell,
  type Stride,
  mostAcross,
  sheetsShowing,
  zoneAt,
  zoneKey,
} from './tile-zones.ts';

/** Half a cutting line, and a little: ink reaches this far beyond the line it is drawn on. */
export const inkReach = 0.5;

/** From the corner of the printed area to the first cell, so that no line is drawn on a trim line; mm. */
export const edge = 1.5;

/** Sheets as pieces are laid on them: cells from one sheet to the next, and their strips. */
export type Lattice = {
  readonly cell: CellSize;
  readonly across: Stride & { readonly cells: number };
  readonly down: Stride & { readonly cells: number };
};

/** Places on a sheet, as cells from its corner, from which a piece needs the same sheets. */
export type PhaseGroup = {
  readonly sheets: readonly Cell[];
  readonly columns: number;
  readonly rows: number;
  readonly phases: readonly Phase[];
  /** The fewest cells it takes on each of those sheets, from whichever of the places. */
  readonly least: readonly number[];
};

/** A place on a sheet, in cells from its corner. */
export type Phase = { readonly x: number; readonly y: number };

/** Cells a piece at a place takes on one of its sheets. */
export const takenOn = (piece: Raster, { x, y }: Phase, sheet: Cell, lattice: Lattice): number => {
  const [wide, high] = [lattice.across.cells, lattice.down.cells];
  const [left, top] = [sheet.column * wide - x, sheet.row * high - y];
  return cellsTaken(piece, left, top, left + wide, top + high);
};

type Growing = Omit<PhaseGroup, 'phases' | 'least'> & { phases: Phase[]; least: number[] };

const none: ReadonlySet<number> = new Set();

/** Zones from one place to another, ink counted. */
const zones = (from: number, to: number, stride: Stride): readonly [number, number] => [
  zoneAt(from - inkReach, stride),
  zoneAt(to + inkReach, stride),
];

/** What a piece covers in each zone of height, laid `y` cells below a sheet's corner. */
function zonesDown({ bands, height }: Raster, y: number, { cell, down }: Lattice) {
  const found = new Map<number, Run[]>();
  bands.forEach((runs, band) => {
    const top = edge + y * cell.y + band * cell.y;
    const foot = Math.min(top + cell.y, edge + y * cell.y + height);
    const [first, last] = zones(top, foot, down);
    for (let zone = first; zone <= last; zone += 1) {
      const there = found.get(zone);
      if (there) there.push(...runs);
      else found.set(zone, [...runs]);
    }
  });
  return [...found].map(([zone, runs]) => ({ zone, runs: merged(runs) }));
}

/** Zones are bits of a number: of fifteen sheets and their strips at most. */
const mostZones = 2 * (mostAcross + 1) + 1;

/** The zones across that some runs ink, a bit each; laid `left` mm from a sheet's corner. */
function zonesAcross(runs: readonly Run[], left: number, across: Stride): number {
  let bits = 0;
  for (const [from, to] of runs) {
    const [first, last] = zones(left + from, left + to, across);
    for (let zone = first; zone <= last && zone < mostZones; zone += 1) bits |= 1 << zone;
  }
  return bits;
}

/** The sheets for zones given as a row's number and its bits. */
function sheetsFor(rows: readonly (readonly [number, number])[]): readonly Cell[] {
  const inked = new Set<number>();
  for (const [zone, bits] of rows) {
    for (let x = 0; x < mostZones; x += 1) if ((bits >>> x) & 1) inked.add(zoneKey(x, zone));
  }
  return sheetsShowing(inked, none);
}

/** All places of a piece on a sheet, those with the same sheets together. */
export function phaseGroups(piece: Raster, lattice: Lattice): readonly PhaseGroup[] {
  const byZones = new Map<string, Growing>();
  const bySheets = new Map<string, Growing>();
  const { cell, across, down } = lattice;
  for (let y = 0; y < down.cells; y += 1) {
    const rows = zonesDown(piece, y, lattice);
    for (let x = 0; x < across.cells; x += 1) {
      const inked = rows.map(
        ({ zone, runs }) => [zone, zonesAcross(runs, edge + x * cell.x, across)] as const,
      );
      const zonesName = inked.join(' ');
      let group = byZones.get(zonesName);
      if (!group) {
        const sheets = sheetsFor(inked);
        const name = sheets.map(({ column, row }) => `${column},${row}`).join(' ');
        group = bySheets.get(name) ?? {
          sheets,
          columns: 1 + Math.max(...sheets.map((each) => each.column)),
          rows: 1 + Math.max(...sheets.map((each) => each.row)),
          phases: [],
          least: sheets.map(() => Infinity),
        };
        byZones.set(zonesName, group);
        bySheets.set(name, group);
      }
      group.phases.push({ x, y });
      const { sheets, least } = group;
      for (let i = 0; i < sheets.length; i += 1) {
        const sheet = sheets[i];
        if (sheet) least[i] = Math.min(least[i] ?? 0, takenOn(piece, { x, y }, sheet, lattice));
      }
    }
  }
  return [...bySheets.values()];
}
