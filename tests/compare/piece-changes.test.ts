import { describe, expect, it } from 'vitest';
import { pieceChanges } from '#shared/compare/piece-changes.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { splitSegment } from '#shared/geometry/curve.ts';
import type { Path } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';
import { middleBody } from '../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: houseRulePresets.balanced });
const name = 'front-middle';

const withFront = (change: (piece: FinishedPiece) => FinishedPiece): readonly FinishedPiece[] =>
  pieces.map((piece) => (piece.name === name ? change(piece) : piece));

describe('two drafts of one gown laid over each other', () => {
  it('show nothing where they are the same, though their stretches are divided otherwise', () => {
    const halved = (path: Path): Path => path.flatMap((each) => [...splitSegment(each, 0.37)]);
    const divided = withFront((piece) => ({ ...piece, cutLine: halved(piece.cutLine) }));
    expect(pieceChanges(pieces, pieces)).toEqual([]);
    expect(pieceChanges(pieces, divided)).toEqual([]);
  });

  it('show how far a piece’s cutting line was moved at one corner', () => {
    const lowered = withFront((piece) => {
      const lowest = Math.max(...piece.cutLine.map((each) => each.to.y));
      const down = (p: { x: number; y: number }) => (p.y === lowest ? point(p.x, p.y + 2) : p);
      const cutLine = piece.cutLine.map((each) =>
        each.kind === 'line' ? { ...each, from: down(each.from), to: down(each.to) } : each,
      );
      return { ...piece, cutLine };
    });
    const [change, ...others] = pieceChanges(pieces, lowered);
    expect(others).toEqual([]);
    expect(change).toMatchObject({ piece: name, change: 'shape' });
    expect(change?.deviation).toBeCloseTo(2, 1);
  });

  it('show a seam that moved under the same cutting line', () => {
    const wider = withFront((piece) => ({
      ...piece,
      edges: piece.edges.map((edge) => ({
        ...edge,
        path: edge.path.map((each) => ({ ...each, to: point(each.to.x + 1, each.to.y) })),
      })),
    }));
    expect(pieceChanges(pieces, wider)).toMatchObject([{ piece: name, change: 'shape' }]);
  });

  it('show a piece that is gone, a new one, and a dart that is', () => {
    const without = pieces.filter((piece) => piece.name !== name);
    expect(pieceChanges(pieces, without)).toMatchObject([{ piece: name, change: 'gone' }]);
    expect(pieceChanges(without, pieces)).toMatchObject([{ piece: name, change: 'new' }]);
    const undarted = withFront((piece) => ({ ...piece, darts: [] }));
    expect(pieceChanges(pieces, undarted)).toMatchObject([{ piece: name, change: 'shape' }]);
  });
});
