import type { DrawnPieces, Gown } from '#shared/api/gowns.ts';
import { problemSchema } from '#shared/api/problem.ts';
import { pieceChanges } from '#shared/compare/piece-changes.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { draftAny } from '#shared/engine/drafted.ts';

/** What the current engine would draw otherwise than an older one did. */
export function redrawingOf(before: DrawnPieces): NonNullable<Gown['redrawing']> {
  try {
    const changes = pieceChanges(before.pieces, draftAny(before.inputs).pieces);
    const deviation = Math.max(0, ...changes.map((each) => each.deviation));
    return { engine: engineVersion, changes: [...changes], deviation, problems: [] };
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    const problems = error.problems.map((each) => problemSchema.parse(each));
    return { engine: engineVersion, changes: [], deviation: 0, problems };
  }
}
