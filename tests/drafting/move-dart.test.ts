import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dartAngle, dartOpening } from '#shared/drafting/dart-angle.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { type DartPlace, moveDart } from '#shared/drafting/move-dart.ts';
import type { Dart, Piece } from '#shared/drafting/piece.ts';
import { seamOf } from '#shared/drafting/seam-stretches.ts';
import { draftBodiceBlock } from '#shared/engine/draft-bodice-block.ts';
import { flatten, pathLength, stationAtLength } from '#shared/geometry/curve.ts';
import { type Point, distance } from '#shared/geometry/point.ts';
import { middleBody } from '../support/middle-body.ts';
import { bodyArbitrary } from '../support/random-body.ts';
import { straplessBustPoint, straplessFront } from '../support/strapless-front.ts';

type Block = { readonly front: Piece; readonly bustPoint: Point };

const present = <T>(value: T | undefined): T => {
  if (value === undefined) throw new Error('nothing there');
  return value;
};

function blockOf(card = middleBody): Block {
  const draft = draftBodiceBlock({ card, style: {}, rules: balanced });
  return { front: present(draft.pieces[0]), bustPoint: present(draft.bustPoint) };
}

const lengthOf = (piece: Piece, name: string): number =>
  pathLength(present(piece.edges.find((edge) => edge.name === name)).path);

const dartNamed = (piece: Piece, name: string): Dart =>
  present(piece.darts.find((dart) => dart.name === name));

const mouthOf = (dart: Dart): readonly [Point, Point] => [
  present(dart.centreLeg[0]).from,
  present(dart.sideLeg[0]).from,
];

/** Sewn length of every seam, darts closed. */
function seamLengths(piece: Piece): Readonly<Record<string, number>> {
  const sums: Record<string, number> = {};
  for (const edge of piece.edges) {
    if (edge.open === true) continue;
    sums[seamOf(edge.name)] = (sums[seamOf(edge.name)] ?? 0) + pathLength(edge.path);
  }
  return sums;
}

/** The outline as a chain of points. */
const outline = (piece: Piece): readonly Point[] =>
  piece.edges.flatMap((edge) => flatten(edge.path, 0.5));

/** Farthest that a corner or a place along an edge lies from the same one on another drawing. */
function farthest(one: Piece, other: Piece): number {
  const places = (piece: Piece): readonly Point[] =>
    piece.edges.flatMap(({ path }) =>
      [0, 0.3, 0.7, 1].map((share) => present(stationAtLength(path, share * pathLength(path))).at),
    );
  expect(one.edges.map((edge) => edge.name)).toEqual(other.edges.map((edge) => edge.name));
  const [a, b] = [places(one), places(other)];
  return Math.max(...a.map((at, k) => distance(at, b[k] ?? { x: Infinity, y: 0 })));
}

/** The six positions of the classroom: the dart starts in the shoulder. */
const sixPlaces = (front: Piece): Readonly<Record<string, DartPlace>> => ({
  shoulder: { edge: 'shoulder-b', at: 0.4 * lengthOf(front, 'shoulder-b') },
  armhole: { edge: 'armhole', at: 0.5 * lengthOf(front, 'armhole') },
  side: { edge: 'side', at: 0.4 * lengthOf(front, 'side') },
  waist: { edge: front.edges.some(({ name }) => name === 'waist-a') ? 'waist-a' : 'waist', at: 30 },
  neck: { edge: 'neck', at: 0.4 * lengthOf(front, 'neck') },
});

/** Where the old dart stood, as a place on the moved piece. */
function placeBack(front: Piece, moved: Piece): DartPlace {
  const name = moved.edges.some((edge) => edge.name === 'shoulder') ? 'shoulder' : 'shoulder-a';
  return { edge: name, at: lengthOf(front, 'shoulder-a') };
}

describe('a dart turned about its point', () => {
  test('opens by 2 R sin(angle/2): 15 degrees are 2.61 at 10 and 5.22 at 20', () => {
    // NIMI, CITS Dress Making 2024, p. 195 (seen): the angle is constant; figures derived.
    expect(dartOpening(15, 100)).toBeCloseTo(26.1, 1);
    expect(dartOpening(15, 200)).toBeCloseTo(52.2, 1);
  });

  test('a waist dart 2.5 wide on legs of 12.5, closed, spreads the hem 47.5 below it by 9.5', () => {
    // Derived (common practice): 11.48 degrees.
    expect(dartAngle(25, 125)).toBeCloseTo(11.48, 2);
    expect(dartOpening(dartAngle(25, 125), 475)).toBeCloseTo(95.0, 1);
  });

  test('on any body each of five seams takes it and gives it back: the outlines coincide', () => {
    // The proof exercise of NIMI p. 195 (seen): pivot, close, stack on the block.
    fc.assert(
      fc.property(bodyArbitrary, (card) => {
        let block: Block;
        try {
          block = blockOf(card);
        } catch (refusal) {
          if (refusal instanceof DraftingError) return;
          throw refusal;
        }
        const { front, bustPoint } = block;
        const before = dartNamed(front, 'bust');
        const angle = dartAngle(distance(...mouthOf(before)), pathLength(before.centreLeg));
        for (const [name, place] of Object.entries(sixPlaces(front))) {
          const moved = present(moveDart(front, 'bust', bustPoint, place));
          for (const [seam, length] of Object.entries(seamLengths(front))) {
            expect(seamLengths(moved)[seam], `${seam}, dart in the ${name}`).toBeCloseTo(length, 6);
          }
          const dart = dartNamed(moved, 'bust');
          const leg = pathLength(dart.centreLeg);
          expect(pathLength(dart.sideLeg)).toBeCloseTo(leg, 6);
          expect(distance(...mouthOf(dart))).toBeCloseTo(dartOpening(angle, leg), 6);
          if (name === 'shoulder') continue;
          const back = present(moveDart(moved, 'bust', bustPoint, placeBack(front, moved)));
          expect(farthest(back, front)).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 150, seed: 20_261_201 },
    );
  });

  test('the sixth, the top line of a strapless front, takes the waist dart and gives it back', () => {
    const front = straplessFront();
    const top = present(
      moveDart(front, 'waist', straplessBustPoint, {
        edge: 'top',
        at: 0.4 * lengthOf(front, 'top'),
      }),
    );
    expect(top.edges.map(({ name }) => name)).toEqual([
      'top-a',
      'waist-mouth-a',
      'top-b',
      'side',
      'waist',
      'centre',
    ]);
    expect(seamLengths(top).top).toBeCloseTo(lengthOf(front, 'top'), 9);
    const back = present(
      moveDart(top, 'waist', straplessBustPoint, {
        edge: 'waist',
        at: lengthOf(front, 'waist-b'),
      }),
    );
    expect(farthest(back, front)).toBeLessThan(1e-9);
    expect(back.levels).toHaveLength(1);
  });

  test('from seam to seam and home again it leaves every point where it was', () => {
    const { front, bustPoint } = blockOf();
    const places: readonly DartPlace[] = [
      { edge: 'armhole', at: 80 },
      { edge: 'side', at: 70 },
      { edge: 'neck', at: 40 },
      { edge: 'shoulder', at: lengthOf(front, 'shoulder-a') },
    ];
    const home = places.reduce((piece, place) => {
      const moved = present(moveDart(piece, 'bust', bustPoint, place));
      expect(outline(moved)).not.toEqual(outline(piece));
      return moved;
    }, front);
    expect(farthest(home, front)).toBeLessThan(1e-9);
    expect(home.notches.map(({ name, edge }) => [name, edge])).toEqual(
      front.notches.map(({ name, edge }) => [name, edge]),
    );
    home.drills.forEach((drill, k) => {
      expect(distance(drill, present(front.drills[k]))).toBeLessThan(1e-6);
    });
  });

  test('letters run from the neck and from the centre out, and partners are lettered alike', () => {
    const { front, bustPoint } = blockOf();
    const names = (piece: Piece): string => piece.edges.map(({ name }) => name).join(' ');
    expect(names(front)).toBe(
      'neck shoulder-a bust-mouth shoulder-b armhole side waist-b waist-mouth-a waist-a centre',
    );
    const side = present(moveDart(front, 'bust', bustPoint, { edge: 'side', at: 80 }));
    expect(names(side)).toBe(
      'neck shoulder armhole side-a bust-mouth side-b waist-b waist-mouth-a waist-a centre',
    );
    expect(side.edges.find(({ name }) => name === 'side-b')?.joins).toEqual({
      piece: 'bodice-back',
      edge: 'side-b',
    });
    const waist = present(moveDart(front, 'bust', bustPoint, { edge: 'waist-b', at: 50 }));
    expect(names(waist)).toBe(
      'neck shoulder armhole side waist-c bust-mouth waist-b waist-mouth-a waist-a centre',
    );
  });

  test('two darts at one point, turned into one, have the sum of their angles', () => {
    // Cone check, reference 3i (derived).
    const { front, bustPoint } = blockOf();
    const angleOf = (dart: Dart): number =>
      dartAngle(distance(...mouthOf(dart)), pathLength(dart.centreLeg));
    const sum = angleOf(dartNamed(front, 'bust')) + angleOf(dartNamed(front, 'waist'));
    const one = present(moveDart(front, 'bust', bustPoint, { dart: 'waist' }));
    expect(one.darts).toHaveLength(1);
    expect(angleOf(dartNamed(one, 'waist'))).toBeCloseTo(sum, 9);
  });

  test('the bust line bends where the dart now turns it, and keeps its length', () => {
    const { front, bustPoint } = blockOf();
    const side = present(moveDart(front, 'bust', bustPoint, { edge: 'side', at: 80 }));
    const length = (piece: Piece): number =>
      piece.levels.reduce((sum, { from, to }) => sum + distance(from, to), 0);
    expect(side.levels).toHaveLength(2);
    expect(length(side)).toBeCloseTo(length(front), 9);
  });

  test('a dart that is not there, a place that is not there, or another point has no answer', () => {
    const { front, bustPoint } = blockOf();
    expect(moveDart(front, 'blade', bustPoint, { edge: 'side', at: 80 })).toBeUndefined();
    expect(moveDart(front, 'bust', bustPoint, { edge: 'hem', at: 80 })).toBeUndefined();
    expect(moveDart(front, 'bust', bustPoint, { edge: 'side', at: 8000 })).toBeUndefined();
    expect(moveDart(front, 'bust', bustPoint, { edge: 'bust-mouth', at: 5 })).toBeUndefined();
    const aside = { x: bustPoint.x + 1, y: bustPoint.y };
    expect(moveDart(front, 'bust', aside, { edge: 'side', at: 80 })).toBeUndefined();
    expect(moveDart(front, 'bust', bustPoint, { dart: 'bust' })).toBeUndefined();
  });
});
