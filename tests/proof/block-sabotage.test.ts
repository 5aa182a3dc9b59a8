import { describe, expect, test } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { draftBodiceBlock } from '#shared/engine/draft-bodice-block.ts';
import { draftSkirtBlock } from '#shared/engine/draft-skirt-block.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { endOf } from '#shared/geometry/curve.ts';
import { type Point, point } from '#shared/geometry/point.ts';
import { proveBlock } from '#shared/proof/prove-block.ts';
import { middleBody } from '../support/middle-body.ts';
import { moveCutPoint, moveSeamPoint, withPiece } from '../support/tamper.ts';

/* Every line of a block's proof must notice one point that slips by a millimetre (or two). */

const bodice = draftBodiceBlock({ card: middleBody, style: {}, rules: balanced });
const skirt = draftSkirtBlock({ card: middleBody, style: {}, rules: balanced });
const sideDart = draftBodiceBlock({
  card: middleBody,
  style: { bustDart: 'side' },
  rules: balanced,
});
type Block = typeof bodice | typeof skirt;
const label = { cardName: 'Test', date: undefined, draftNumber: 'TEST', cloth: 'block' };

const failed = (block: Block, pieces: readonly FinishedPiece[]): readonly number[] =>
  proveBlock({ pieces, wanted: block.wanted, rules: balanced })
    .lines.filter((line) => !line.holds)
    .map((line) => line.number);

const placeOf = (at: Point | undefined): Point => {
  if (!at) throw new Error('nothing there');
  return at;
};

const endOfEdge = (block: Block, piece: string, edge: string): Point =>
  placeOf(
    endOf(
      block.pieces.find(({ name }) => name === piece)?.edges.find(({ name }) => name === edge)
        ?.path ?? [],
    ),
  );

const afterMoving = (block: Block, name: string, place: Point, by: Point): readonly number[] =>
  failed(
    block,
    withPiece(block.pieces, name, (piece) =>
      finishPiece(moveSeamPoint(piece, place, by), balanced, label),
    ),
  );

describe('one point of a block moved', () => {
  test('nothing fails before anything is moved', () => {
    for (const block of [bodice, skirt, sideDart]) expect(failed(block, block.pieces)).toEqual([]);
  });

  test('line 1: the hip of the skirt let out by a millimetre', () => {
    const hip = placeOf(skirt.pieces[0]?.levels.find(({ level }) => level === 'hip')?.to);
    expect(afterMoving(skirt, 'skirt-front', hip, point(1, 0))).toContain(1);
  });

  test('line 1: the waist of the bodice, counted along its seam', () => {
    const corner = endOfEdge(bodice, 'bodice-front', 'side');
    expect(afterMoving(bodice, 'bodice-front', corner, point(1, 0))).toContain(1);
  });

  test('line 1: the bust, where the line bends at a side dart', () => {
    const pieces = withPiece(sideDart.pieces, 'bodice-front', (piece) => ({
      ...piece,
      levels: piece.levels.slice(0, 1),
    }));
    expect(failed(sideDart, pieces)).toContain(1);
  });

  test('line 2: a shoulder longer than its partner and its ease', () => {
    const tip = endOfEdge(bodice, 'bodice-back', 'shoulder-b');
    expect(afterMoving(bodice, 'bodice-back', tip, point(1, 0.4))).toContain(2);
  });

  test('line 3: one leg of the bust dart longer than the other', () => {
    const mouth = endOfEdge(bodice, 'bodice-front', 'shoulder-a');
    expect(afterMoving(bodice, 'bodice-front', mouth, point(0, -1))).toContain(3);
  });

  test('line 4: the neck no longer square to the centre front', () => {
    const neck = endOfEdge(bodice, 'bodice-front', 'centre');
    expect(afterMoving(bodice, 'bodice-front', neck, point(0, 1))).toContain(4);
  });

  test('line 5: a corner of the cutting line pulled in', () => {
    const piece = placeOf(skirt.pieces[0]?.cutLine[2]?.to);
    const pieces = withPiece(skirt.pieces, 'skirt-front', (each) =>
      moveCutPoint(each, piece, point(-1, -1)),
    );
    expect(failed(skirt, pieces)).toEqual([5]);
  });
});
