import { describe, expect, it } from 'vitest';

import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { pathLength } from '#shared/geometry/curve.ts';

import { asCut } from '../../../../../src/features/drafting-table/canvas/layout.ts';
import {
  pieceAt,
  shifted,
} from '../../../../../src/features/drafting-table/canvas/moved-pieces.ts';
import {
  tapeCorners,
  tapePlace,
  tapeReading,
} from '../../../../../src/features/drafting-table/canvas/tape.ts';
import { middleBody } from '../../../../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: balanced });
const layout = asCut(pieces);
const middle = pieces.find(({ name }) => name === 'front-middle');
const side = middle?.edges.find(({ name }) => name === 'side');
const cornersOfSide = tapeCorners(layout).filter(({ on }) =>
  on.some(({ piece, edge }) => piece === 'front-middle' && edge === 'side'),
);

describe('the measuring tape', () => {
  it('reads a seam from corner to corner as long as the seam is', () => {
    const [from, to] = cornersOfSide;
    if (!from || !to || !side) throw new Error('the side seam has two corners');
    const reading = tapeReading(from, to);
    expect(reading.along?.length).toBeCloseTo(pathLength(side.path), 9);
    expect(reading.along?.length).toBeGreaterThan(reading.straight);
  });

  it('catches a corner before the seam beside it, and the bare paper where nothing is near', () => {
    const [corner] = cornersOfSide;
    if (!corner) throw new Error('the side seam has a corner');
    expect(tapePlace(layout, { x: corner.at.x + 3, y: corner.at.y + 2 }, 5)).toEqual(corner);
    expect(tapePlace(layout, { x: -900, y: -900 }, 5)).toEqual({
      at: { x: -900, y: -900 },
      on: [],
    });
  });

  it('reads part of a seam along its curve', () => {
    const [from] = cornersOfSide;
    const first = side?.path[0];
    const placed = layout.placed.find(({ piece }) => piece.name === 'front-middle');
    if (!from || !first || !placed) throw new Error('the side seam has a joint');
    const at = { x: first.to.x + placed.at.x, y: first.to.y + placed.at.y };
    const reading = tapeReading(from, tapePlace(layout, at, 1));
    expect(reading.along?.length).toBeCloseTo(pathLength([first]), 1);
  });
});

describe('pieces moved about', () => {
  it('are found where they were moved to, and lie where they lay once they are snapped back', () => {
    const [first] = layout.placed;
    if (!first) throw new Error('there is a piece');
    const { name } = first.piece;
    const by = { x: -5000, y: 0 };
    const away = shifted(layout, { [name]: by });
    const spot = {
      x: (first.box.left + first.box.right) / 2,
      y: (first.box.top + first.box.bottom) / 2,
    };
    expect(pieceAt(layout, spot)).toBe(name);
    expect(pieceAt(away, spot)).toBeUndefined();
    expect(pieceAt(away, { x: spot.x + by.x, y: spot.y })).toBe(name);
    expect(shifted(layout, {})).toBe(layout);
  });
});
