import { describe, expect, test } from 'vitest';
import type { Edge, FinishedPiece } from '#shared/drafting/piece.ts';
import { line } from '#shared/geometry/path.ts';
import { type Point, point } from '#shared/geometry/point.ts';
import type { Proof, ProofLine } from '#shared/proof/proof.ts';
import { prove } from '#shared/proof/prove.ts';
import { moveCutPoint, moveSeamPoint, withPiece } from '../support/tamper.ts';
import { bandConstruction, bandPieces, plainRules } from './straight-band.ts';

const proofOf = (pieces: readonly FinishedPiece[]): Proof =>
  prove({ pieces, construction: bandConstruction, rules: plainRules });

const failed = (proof: Proof): readonly number[] =>
  proof.lines.filter((each) => !each.holds).map((each) => each.number);

const lineOf = (proof: Proof, number: number): ProofLine => {
  const found = proof.lines.find((each) => each.number === number);
  if (!found) throw new Error(`no proof line ${number}`);
  return found;
};

const afterMoving = (name: string, place: Point, by: Point): readonly number[] =>
  failed(proofOf(withPiece(bandPieces, name, (piece) => moveSeamPoint(piece, place, by))));

/** The pieces with one edge of one piece changed. */
const withEdge = (
  name: string,
  edgeName: string,
  change: (edge: Edge) => Edge,
): readonly FinishedPiece[] =>
  withPiece(bandPieces, name, (piece) => ({
    ...piece,
    edges: piece.edges.map((edge) => (edge.name === edgeName ? change(edge) : edge)),
  }));

/** The back top with its bust notch elsewhere. */
const withNotchAt = (at: Point): readonly FinishedPiece[] =>
  withPiece(bandPieces, 'back-top', (piece) => ({
    ...piece,
    notches: piece.notches.map((notch) => ({ ...notch, at })),
  }));

describe('a plain band that was reckoned by hand', () => {
  const proof = proofOf(bandPieces);

  test('sews together, and says so', () => {
    expect(failed(proof)).toEqual([]);
    expect(proof.holds).toBe(true);
    expect(proof.verdict).toEqual(['These pieces sew together.']);
  });

  test('has its girths measured on the pieces, level by level', () => {
    const measured = proof.girths.map((row) => [row.level, Math.round(row.pieces * 1000) / 1000]);
    expect(measured).toEqual([
      ['chest', 886],
      ['bust', 920],
      ['underbust', 916],
      ['waist-seam', 912],
      ['hip', 912],
    ]);
  });

  test('has every joined seam walked once, and its centre back named as a pair', () => {
    expect(proof.seams).toHaveLength(8);
    const pair = proof.seams.find((row) => row.title === 'Back top, centre, left to right');
    expect(pair?.first.length).toBe(300);
  });

  test('has its openings carried on straight above the edge', () => {
    const openings = lineOf(proof, 8).findings.slice(0, 2);
    expect(openings.map((each) => each.value)).toEqual([2.5, 2.5]);
  });

  test('reports the closed top edge, and marks an estimated upper chest', () => {
    const words = lineOf(proof, 8).findings.map((each) => JSON.stringify(each.said));
    expect(words.some((each) => each.includes('closed top edge') && each.includes('912'))).toBe(
      true,
    );
    expect(words.some((each) => each.includes('The upper chest is an estimate.'))).toBe(true);
  });
});

describe('one point of the band moved by a millimetre', () => {
  test('a side seam let out at the hip no longer measures the hip', () => {
    const through = withEdge('front-middle', 'side', (edge) => ({
      ...edge,
      path: [line(point(228, 300), point(228, 500)), line(point(228, 500), point(228, 900))],
    }));
    const letOut = withPiece(through, 'front-middle', (piece) =>
      moveSeamPoint(piece, point(228, 500), point(1, 0)),
    );
    expect(failed(proofOf(through))).toEqual([]);
    expect(failed(proofOf(letOut))).toEqual([1, 5]);
  });

  test('a side seam lengthened at the hem no longer matches its partner', () => {
    expect(afterMoving('front-middle', point(228, 900), point(0, 1))).toEqual([2, 5]);
  });

  test('a notch moved along its seam no longer meets its partner', () => {
    expect(failed(proofOf(withNotchAt(point(230, 151))))).toEqual([2]);
  });

  test('a notch beside its seam marks nothing', () => {
    expect(failed(proofOf(withNotchAt(point(231, 150))))).toEqual([2]);
  });

  test('a notch without a partner on the other side of its seam is found', () => {
    for (const name of ['front-top', 'back-top']) {
      const lone = withPiece(bandPieces, name, (piece) => ({ ...piece, notches: [] }));
      expect(failed(proofOf(lone))).toEqual([2]);
    }
  });

  test('a dart tip moved aside makes its legs unequal', () => {
    const steep = withPiece(bandPieces, 'front-top', (piece) => ({
      ...piece,
      darts: piece.darts.map((dart) => ({
        ...dart,
        centreLeg: dart.centreLeg.map(({ from }) => line(from, point(101, 150))),
        sideLeg: dart.sideLeg.map(({ from }) => line(from, point(100, 155))),
      })),
    }));
    expect(failed(proofOf(steep))).toContain(3);
  });

  test('a cutting line moved in no longer stands off by its allowance', () => {
    const moved = withPiece(bandPieces, 'back-top', (piece) =>
      moveCutPoint(piece, point(255, -10), point(-1, 0)),
    );
    expect(failed(proofOf(moved))).toEqual([5]);
  });

  test('a dart leg moved at the top edge changes the opening and the chest girth with it', () => {
    expect(afterMoving('front-top', point(99, 0), point(-1, 0))).toEqual([1, 8]);
  });

  test('a centre front raised at the top is no longer square', () => {
    expect(afterMoving('front-top', point(0, 0), point(0, -1))).toEqual([4, 5]);
  });
});

describe('faults of a whole piece', () => {
  test('an outline left open is found, with the gap', () => {
    const open = withEdge('front-top', 'side', (edge) => ({
      ...edge,
      path: [line(point(230, 0), point(230, 299))],
    }));
    const finding = lineOf(proofOf(open), 5).findings.find((each) => !each.holds);
    expect(finding?.value).toBe(1);
  });

  test('an outline that crosses itself is found', () => {
    const crossed = afterMoving('front-middle', point(228, 900), point(-300, -800));
    expect(crossed).toContain(5);
  });

  test('an outline drawn the wrong way round is found', () => {
    const turned = withPiece(bandPieces, 'back-middle', (piece) => ({
      ...piece,
      edges: piece.edges
        .map((edge) => ({ ...edge, path: edge.path.map((each) => line(each.to, each.from)) }))
        .reverse(),
    }));
    const words = lineOf(proofOf(turned), 5)
      .findings.filter((each) => !each.holds)
      .map((each) => each.said[0]);
    expect(words).toContain('Back middle, seam line: runs the wrong way round.');
  });

  test('an edge that names a partner which does not answer is found', () => {
    const astray = withEdge('front-middle', 'side', (edge) => ({
      ...edge,
      joins: { piece: 'back-middle', edge: 'hem' },
    }));
    expect(failed(proofOf(astray))).toContain(2);
  });

  test('ease that is stated is taken in before the seams are compared', () => {
    const eased = withEdge('front-middle', 'side', (edge) => ({ ...edge, ease: 3 }));
    expect(failed(proofOf(eased))).toContain(2);
    const longer = withEdge('front-middle', 'side', (edge) => ({
      ...edge,
      ease: 3,
      path: [line(point(228, 300), point(228, 903))],
    }));
    const seam = lineOf(proofOf(longer), 2).findings.find((each) => each.expected === 600);
    expect(seam?.holds).toBe(true);
  });

  test('the verdict says what does not hold', () => {
    const [opening, what] = proofOf(withNotchAt(point(230, 151))).verdict;
    expect(opening).toBe('These pieces do not sew together yet. ');
    expect(what).toContain('the notches “bust” lie ');
  });
});

describe('a dart and the edge it closes', () => {
  const withDrop = (drop: number): readonly FinishedPiece[] =>
    withEdge('front-top', 'top-a', (edge) => ({
      ...edge,
      path: [line(point(0, 0), point(60, 0)), line(point(60, 0), point(99, drop))],
    }));

  test('may bend by less than two degrees where it closes', () => {
    expect(lineOf(proofOf(withDrop(0)), 3).holds).toBe(true);
  });

  test('may not bend by more', () => {
    expect(lineOf(proofOf(withDrop(2)), 3).holds).toBe(false);
  });
});
