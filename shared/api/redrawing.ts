import { z } from 'zod';
import type { PieceChange } from '../compare/piece-changes.ts';
import { problemSchema } from './problem.ts';

const pieceChange = z.object({
  piece: z.string(),
  title: z.string(),
  change: z.enum(['shape', 'new', 'gone']),
  deviation: z.number(),
}) satisfies z.ZodType<PieceChange>;

/** What the current engine would make of a gown that an older one drew, from the same inputs. */
export const redrawing = z.object({
  engine: z.string(),
  /** Pieces that would come out otherwise; none where the two engines agree on this gown. */
  changes: z.array(pieceChange),
  /** Farthest that any line of a piece would move, mm. */
  deviation: z.number(),
  /** Why the current engine would not draw it at all; empty where it would. */
  problems: z.array(problemSchema),
});
