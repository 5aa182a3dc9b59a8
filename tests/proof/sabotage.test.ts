import { describe, expect, test } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { Edge, FinishedPiece } from '#shared/drafting/piece.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { endOf, endTangent, startOf } from '#shared/geometry/curve.ts';
import { type Path, cubic } from '#shared/geometry/path.ts';
import { type Point, distance, point, scale } from '#shared/geometry/point.ts';
import { prove } from '#shared/proof/prove.ts';
import { middleBody } from '../support/middle-body.ts';
import { moveCutPoint, moveSeamPoint, withPiece } from '../support/tamper.ts';

/*
 * Every line of the proof must notice a point that slips by a millimetre. The seam lines of the
 * sample gown are moved and the piece is given its allowances anew, as a maker would who redraws it:
 * then exactly the line that looks after that point fails.
 */

const draft = draftGown({ card: middleBody, style: { shaping: 'princess' }, rules: balanced });
const label = { cardName: 'Test', date: undefined, draftNumber: 'TEST', cloth: 'cloth' };

const failedLines = (pieces: readonly FinishedPiece[]): readonly number[] =>
  prove({ pieces, construction: draft.construction, rules: balanced })
    .lines.filter((line) => !line.holds)
    .map((line) => line.number);

const pieceNamed = (name: string): FinishedPiece => {
  const found = draft.pieces.find((piece) => piece.name === name);
  if (!found) throw new Error(`no piece ${name}`);
  return found;
};

const edgeNamed = (piece: string, name: string): Edge => {
  const found = pieceNamed(piece).edges.find((edge) => edge.name === name);
  if (!found) throw new Error(`no edge ${name}`);
  return found;
};

const placeOf = (at: Point | undefined): Point => {
  if (!at) throw new Error('nothing there');
  return at;
};

/** What fails when one point of a piece moves and the piece is finished anew. */
const afterMoving = (name: string, place: Point, by: Point): readonly number[] => {
  expect(Math.hypot(by.x, by.y)).toBeCloseTo(1, 6);
  const moved = moveSeamPoint(pieceNamed(name), place, by);
  expect(moved).not.toEqual(pieceNamed(name));
  const redrawn = withPiece(draft.pieces, name, () => finishPiece(moved, balanced, label));
  return failedLines(redrawn);
};

/** A straight edge as an S that swings so far to either side, upright to its ends as before. */
function wave(path: Path, by: number): Path {
  const [from, until] = [placeOf(startOf(path)), placeOf(endOf(path))];
  const at = (share: number, off: number): Point => ({
    x: from.x + share * (until.x - from.x),
    y: from.y + share * (until.y - from.y) + off,
  });
  const hill = (start: number, off: number): Path => [
    cubic(at(start, 0), at(start + 0.08, 0), at(start + 0.17, off), at(start + 0.25, off)),
    cubic(at(start + 0.25, off), at(start + 0.33, off), at(start + 0.42, 0), at(start + 0.5, 0)),
  ];
  return [...hill(0, by), ...hill(0.5, -by)];
}

describe('one point of the sample gown moved by a millimetre', () => {
  test('nothing fails before anything is moved', () => {
    expect(failedLines(draft.pieces)).toEqual([]);
  });

  test('line 1: the side seam let out at the hip is found by the girths', () => {
    const hip = placeOf(pieceNamed('front-middle').levels.find((each) => each.level === 'hip')?.to);
    expect(afterMoving('front-middle', hip, point(1, 0))).toEqual([1]);
  });

  test('line 2: the side seam lengthened at the knee is found by the seams', () => {
    const knee = placeOf(endOf(edgeNamed('front-middle', 'side').path));
    expect(afterMoving('front-middle', knee, point(0, 1))).toEqual([2]);
  });

  test('line 2: a notch slipped along its seam is found by the seams', () => {
    const shifted = withPiece(draft.pieces, 'back-middle', (piece) => ({
      ...piece,
      notches: piece.notches.map((notch) =>
        notch.name === 'hip' ? { ...notch, at: point(notch.at.x, notch.at.y + 1) } : notch,
      ),
    }));
    expect(failedLines(shifted)).toEqual([2]);
  });

  test('line 3: a dart tip moved aside is found by its legs', () => {
    const tip = placeOf(endOf(pieceNamed('front-middle').darts[0]?.centreLeg ?? []));
    expect(afterMoving('front-middle', tip, point(1, 0))).toEqual([3]);
  });

  test('line 4: a handle of the top line moved at the centre front is found by its corner', () => {
    const [first] = edgeNamed('front-top-centre', 'top').path;
    if (first?.kind !== 'cubic') throw new Error('the top line is not a curve');
    expect(afterMoving('front-top-centre', first.c1, point(0, 1))).toEqual([4]);
  });

  test.each(['front-middle', 'back-middle', 'flare-back'])(
    'line 5: any corner of the cutting line of %s, moved in, is found by its clearance',
    (name) => {
      const { cutLine, edges } = pieceNamed(name);
      const middle = scale(
        edges
          .flatMap((edge) => startOf(edge.path) ?? [])
          .reduce((sum, each) => point(sum.x + each.x, sum.y + each.y), point(0, 0)),
        1 / edges.length,
      );
      for (const { from } of cutLine) {
        const by = scale(point(middle.x - from.x, middle.y - from.y), 1 / distance(middle, from));
        const moved = withPiece(draft.pieces, name, (piece) => moveCutPoint(piece, from, by));
        expect.soft(failedLines(moved), `${from.x}, ${from.y}`).toEqual([5]);
      }
    },
  );

  test('line 6: a knee seam that waves by eight millimetres is found by its bends, and by its length', () => {
    const waved = withPiece(draft.pieces, 'front-middle', (piece) =>
      finishPiece(
        {
          ...piece,
          edges: piece.edges.map((edge) =>
            edge.name === 'knee' ? { ...edge, path: wave(edge.path, 8) } : edge,
          ),
        },
        balanced,
        label,
      ),
    );
    expect(failedLines(waved)).toEqual([2, 6]);
  });

  test('line 7: a zip that ends too high is found by the hips it has to pass', () => {
    const short = withPiece(draft.pieces, 'back-middle', (piece) => ({
      ...piece,
      notches: piece.notches.map((notch) =>
        notch.name === 'zip-end' ? { ...notch, at: point(notch.at.x, notch.at.y - 60) } : notch,
      ),
    }));
    expect(failedLines(short)).toEqual([7]);
  });

  test('line 7: a gown without the mark of its zip cannot be known to open', () => {
    const shut = withPiece(draft.pieces, 'back-middle', (piece) => ({
      ...piece,
      notches: piece.notches.filter(({ name }) => name !== 'zip-end'),
    }));
    expect(failedLines(shut)).toEqual([7]);
  });

  test('line 7: a knee seam that does not reach round both knees is found', () => {
    const knees = { ...draft.construction.knees, standing: 900 };
    const { lines } = prove({
      pieces: draft.pieces,
      construction: { ...draft.construction, knees },
      rules: balanced,
    });
    expect(lines.filter(({ holds }) => !holds).map(({ number }) => number)).toEqual([7]);
  });

  test('line 8: a leg moved at the top edge is found by its opening, and so by the chest girth', () => {
    const { path } = edgeNamed('front-top-centre', 'top');
    const along = scale(endTangent(path), -1);
    expect(afterMoving('front-top-centre', placeOf(endOf(path)), along)).toEqual([1, 8]);
  });
});
