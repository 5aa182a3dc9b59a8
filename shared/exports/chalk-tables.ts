import type { Drafted } from '../engine/drafted.ts';
import type { Paper } from '../sheets/papers.ts';
import type { Unit } from '../units/said.ts';
import { bandRows } from './chalk-band.ts';
import { flareRows } from './chalk-flare.ts';
import { type ChalkLayout, chalkHalves, layChalkSheet } from './chalk-layout.ts';
import { type Row, allowanceRows, levelRows, pieceRows, pointRows } from './chalk-rows.ts';
import type { Mark } from './drawing.ts';
import { type Column, drawRows, flowRows } from './row-flow.ts';

/** Line steps tried, mm, from easy to read down to small print (2 mm type) on the widest, tallest bodies. */
const steps = [3.4, 3.2, 3, 2.9, 2.8, 2.7, 2.6, 2.5, 2.45];

/** Smallest line step at which a half's table is kept whole inside it rather than set larger and parted, mm. */
const wholeDownTo = 2.6;

/** Room kept free for figures below the drawings, mm: none first, then more on bodies with many. */
const reserves = [0, 30, 60, 90];

/** Marks of tables that fit, made only when asked for: most that are tried do not. */
type Tables = () => readonly Mark[];

/** The first of some things that gives an answer. */
function firstOf<T, R>(tried: readonly T[], attempt: (each: T) => R | undefined): R | undefined {
  for (const each of tried) {
    const found = attempt(each);
    if (found !== undefined) return found;
  }
  return undefined;
}

function whole(rows: readonly Row[], columns: readonly Column[], step: number): Tables | undefined {
  const flow = flowRows(rows, columns, step);
  return flow.rest.length === 0 ? () => drawRows(flow, step) : undefined;
}

/** Each half's points whole inside it, the other figures beside and below; none where that is too small. */
function tablesInside(
  { front, back, columns }: ChalkLayout,
  points: readonly (readonly Row[])[],
  facts: readonly Row[],
): Tables | undefined {
  const readable = steps.filter((each) => each >= wholeDownTo);
  const own = firstOf(readable, (step) => {
    const first = whole(points[0] ?? [], front.inside, step);
    const second = whole(points[1] ?? [], back.inside, step);
    return first && second ? () => [...first(), ...second()] : undefined;
  });
  const others = firstOf(readable, (step) => whole(facts, columns, step));
  return own && others ? () => [...own(), ...others()] : undefined;
}

/** Points inside the halves as far as they go, the rest wherever the page is free. */
function tablesParted(
  { front, back, columns }: ChalkLayout,
  points: readonly (readonly Row[])[],
  facts: readonly Row[],
  step: number,
): Tables | undefined {
  const own = [front, back].map((half, i) => flowRows(points[i] ?? [], half.inside, step));
  const over = own.flatMap((each) => each.rest);
  const continued: readonly Row[] =
    over.length === 0 ? [] : [{ kind: 'heading', text: 'Points continued' }, ...over];
  const room = [...columns, ...own.flatMap((each) => each.room)];
  const free = whole([...facts, ...continued], room, step);
  return free && (() => [...own.flatMap((each) => drawRows(each, step)), ...free()]);
}

export type ChalkTables = { readonly layout: ChalkLayout; readonly marks: readonly Mark[] };

/**
 * Drawings and tables with the largest print that fits above `bottom`; on the largest bodies without
 * what the pieces and the cover repeat. Any draft fits; a plain error would be a fault of ours.
 */
export function layChalkTables(
  draft: Drafted,
  paper: Paper,
  bottom: number,
  unit: Unit,
): ChalkTables {
  const flare = draft.pieces.filter((each) => each.part === 'flare');
  const bands = draft.pieces.filter((each) => each.part === 'sleeve');
  const needed = [...levelRows(draft, unit), ...flareRows(flare, unit), ...bandRows(bands, unit)];
  const facts = [...needed, ...pieceRows(draft.pieces), ...allowanceRows(draft, unit)];
  const halves = chalkHalves(draft);
  const points = halves.map((half) => pointRows(half.title, half.points, unit));
  const layouts = reserves.map((reserve) => layChalkSheet(draft, halves, paper, bottom, reserve));
  const withTables = (set: (layout: ChalkLayout) => Tables | undefined): ChalkTables | undefined =>
    firstOf(layouts, (layout) => {
      const tables = set(layout);
      return tables && { layout, marks: tables() };
    });
  const parted = (rows: readonly Row[]): ChalkTables | undefined =>
    firstOf(steps, (step) => withTables((layout) => tablesParted(layout, points, rows, step)));
  const laid =
    withTables((layout) => tablesInside(layout, points, facts)) ?? parted(facts) ?? parted(needed);
  if (!laid) throw new Error('The chalk sheet has more figures than one page holds.');
  return laid;
}
