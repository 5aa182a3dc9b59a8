import { type Path, line } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { Problem } from '../units/problem.ts';
import { type Said, mm, said } from '../units/said.ts';
import { type Quantity, worked } from './quantity.ts';
import type { Step } from './step.ts';

/** What a step may add beside its sentence. */
export type Drawn = {
  readonly why?: Said;
  readonly points?: Readonly<Record<string, Point>>;
  readonly lines?: readonly Path[];
  readonly measures?: readonly string[];
  readonly pieces?: readonly string[];
};

/** The table set up for one part of the draft: each verb computes, draws and is remembered. */
export type PartTable = {
  /** Hangs a level below the side neck point and gives its height; `of`: where it rests on other measures than it names. */
  readonly level: (
    name: string,
    how: Said,
    y: number,
    measures: readonly string[],
    of?: readonly string[],
  ) => number;
  /** Squares a width out from the centre line at a height and gives its end point. */
  readonly squareAcross: (name: string, y: number, width: Quantity, why?: Said) => Point;
  /** Draws what the sentence says. */
  readonly draw: (title: string, sentence: Said, drawn?: Drawn) => void;
};

/** A drafting table: it remembers every step in drafting order, and what the maker should be told. */
export type DraftingTable = {
  readonly part: (name: string, side: Step['side']) => PartTable;
  readonly warn: (problem: Problem) => void;
  readonly steps: readonly Step[];
  readonly warnings: readonly Problem[];
};

const slug = (words: string): string =>
  words
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');

/** A level is ruled so far across, mm: past the side of a middle body; its quarter is measured off later. */
const levelReach = 300;

/** A clean table. */
export function openTable(): DraftingTable {
  const steps: Step[] = [];
  const warnings: Problem[] = [];
  const part = (name: string, side: Step['side']): PartTable => {
    const draw = (title: string, sentence: Said, drawn: Drawn = {}): void => {
      steps.push({
        id: `${slug(name)}/${slug(title)}`,
        part: name,
        title,
        said: sentence,
        ...(drawn.why ? { why: drawn.why } : {}),
        points: drawn.points ?? {},
        lines: drawn.lines ?? [],
        side,
        measures: drawn.measures ?? [],
        ...(drawn.pieces ? { pieces: drawn.pieces } : {}),
      });
    };
    return {
      draw,
      level: (title, how, y, measures, of = measures) => {
        draw(`${title} level`, said`${how}: ${mm(y, of)} below the side neck point.`, {
          points: { [slug(title)]: { x: 0, y } },
          lines: [[line({ x: 0, y }, { x: levelReach, y })]],
          measures,
        });
        return y;
      },
      squareAcross: (title, y, width, why) => {
        const end = { x: width.value, y };
        draw(title, said`Square out from the centre: ${worked(width)}.`, {
          points: { [slug(title)]: end },
          lines: [[line({ x: 0, y }, end)]],
          measures: width.measures,
          ...(why ? { why } : {}),
        });
        return end;
      },
    };
  };
  return { part, warn: (problem) => void warnings.push(problem), steps, warnings };
}
