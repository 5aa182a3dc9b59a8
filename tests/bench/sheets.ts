import { shapeOf } from '#shared/sheets/layout.ts';
import { papers } from '#shared/sheets/papers.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { inRows, sheetsOf } from '#shared/sheets/shelves.ts';
import { plainRows } from '../support/plain-rows.ts';
import { tenGowns } from '../support/ten-gowns.ts';

/** One line of the benchmark's report: the sheets a gown takes, ways of arranging beside each other. */
export type SheetBench = {
  readonly name: string;
  readonly sheets: number;
  readonly glueSeams: number;
  readonly ms: number;
  /** Pieces as drafted in rows; and the best of thirty ways to lay rows. */
  readonly against: string;
  /** Ours as a part of plain rows, and of the best rows. */
  readonly ratio: number;
  readonly ratioToBest: number;
};

const round = (value: number): number => Math.round(value * 100) / 100;

/** Sheets of A4 for ten gowns, covers not counted. */
export function benchSheets(): readonly SheetBench[] {
  return tenGowns().map(({ name, draft }) => {
    const shapes = draft.pieces.map((each) => shapeOf(each));
    const plain = sheetsOf(plainRows(shapes), papers.A4, plainOrder);
    const best = sheetsOf(inRows(shapes, papers.A4, plainOrder), papers.A4, plainOrder);
    const start = performance.now();
    const { plan } = planSheets(draft.pieces, plainOrder);
    const ms = Math.round(performance.now() - start);
    const sheets = plan.tiles.length;
    return {
      name: `A4 sheets of the ${name}`,
      sheets,
      glueSeams: plan.glueSeams,
      ms,
      against: `plain rows: ${plain}, best of thirty rows: ${best}`,
      ratio: round(sheets / plain),
      ratioToBest: round(sheets / best),
    };
  });
}
