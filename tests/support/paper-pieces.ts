import type { Edge, FinishedPiece } from '#shared/drafting/piece.ts';
import { line, type Path } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';

/** A rectangle of cloth, made by hand: no allowance, a grain line, its name. */
export function oblong(
  name: string,
  width: number,
  height: number,
  changes: Partial<FinishedPiece> = {},
): FinishedPiece {
  const corners = [point(0, 0), point(width, 0), point(width, height), point(0, height)];
  const sides = ['top', 'side', 'hem', 'centre'];
  const edges = corners.map((from, i): Edge => {
    const to = corners[(i + 1) % 4] ?? from;
    return { name: sides[i] ?? '', path: [line(from, to)], kind: i === 3 ? 'fold' : 'seam' };
  });
  const cutLine: Path = edges.flatMap((each) => each.path);
  return {
    name,
    title: name,
    side: 'front',
    part: 'top',
    cut: 'cut 1 on fold',
    copies: 1,
    edges,
    darts: [],
    levels: [],
    notches: [],
    notchMarks: [],
    grain: { from: point(width / 2, height * 0.8), to: point(width / 2, height * 0.2) },
    drills: [],
    cutLine,
    lettering: [{ text: name, at: point(width / 4, height / 2), size: 6 }],
    ...changes,
  };
}
