import { z } from 'zod';
import {
  type PrintOrder,
  drawnHow,
  lineChoices,
  orientations,
  plainOrder,
  printScales,
  sheetNames,
} from '../sheets/print-order.ts';
import { selections } from '../sheets/selection.ts';

/** No draft has so many pieces, and no plan names so many sheets. */
const mostPieces = 60;
const mostLeftOut = 300;

const pieceOrder = z.strictObject({
  piece: z.string().max(60),
  copies: z.number(),
  how: z.enum(drawnHow),
});

/**
 * Shape of an order for sheets; what is left out is as `plainOrder` has it. Bounds are `checkOrder`'s to
 * say, in the reader's unit.
 */
export const printOrder = z.strictObject({
  paper: z
    .union([z.enum(sheetNames), z.strictObject({ width: z.number(), height: z.number() })])
    .default(plainOrder.paper),
  orientation: z.enum(orientations).default(plainOrder.orientation),
  margin: z.number().default(plainOrder.margin),
  overlap: z.number().default(plainOrder.overlap),
  glueMarks: z.boolean().default(plainOrder.glueMarks),
  pieces: z
    .union([z.enum(selections), z.array(pieceOrder).max(mostPieces).readonly()])
    .default(plainOrder.pieces),
  lines: z.enum(lineChoices).default(plainOrder.lines),
  inkSaving: z.boolean().default(plainOrder.inkSaving),
  scale: z.literal(printScales).default(plainOrder.scale),
  leftOut: z.array(z.string().max(8)).max(mostLeftOut).readonly().default([]),
}) satisfies z.ZodType<PrintOrder>;
