import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { orderOf } from '../../../../src/features/print-room/order-of.ts';
import {
  type RoomAction,
  type RoomChoices,
  plainChoices,
  roomChoices,
} from '../../../../src/features/print-room/room-choices.ts';
import { middleBody } from '../../../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: balanced });
const after = (...actions: readonly RoomAction[]): RoomChoices =>
  actions.reduce(roomChoices, plainChoices('cm', 'A4'));
const order = (...actions: readonly RoomAction[]) => {
  const asked = orderOf(after(...actions), pieces);
  return 'order' in asked ? asked.order : asked.problems;
};
const piece = (name: string) => {
  const found = pieces.find((each) => each.name === name);
  if (found === undefined) throw new Error(`no piece ${name}`);
  return found;
};

describe('what is chosen becomes an order', () => {
  it('before anything is chosen it is the plain order of the quick print', () => {
    expect(order()).toEqual(plainOrder);
  });

  it('exactly the top pieces are the bodice toile, whichever way they were chosen', () => {
    const skirts = pieces.filter(({ part }) => part !== 'top');
    const ticked = skirts.map((each): RoomAction => ({
      type: 'piece',
      piece: each,
      choice: { printed: false },
    }));
    expect(order(...ticked)).toMatchObject({ pieces: 'bodice-toile' });
    expect(order({ type: 'selected', pieces, selection: 'bodice-toile' })).toEqual(
      order(...ticked),
    );
  });

  it('a second copy or another way of drawing names the pieces one by one', () => {
    const asked = order(
      { type: 'selected', pieces, selection: 'bodice-toile' },
      { type: 'piece', piece: piece('front-top-centre'), choice: { how: 'opened out' } },
      { type: 'piece', piece: piece('back-top-side'), choice: { copies: 2 } },
    );
    expect('pieces' in asked && asked.pieces).toEqual([
      { piece: 'front-top-centre', copies: 1, how: 'opened out' },
      { piece: 'front-top-side', copies: 1, how: 'drawn once' },
      { piece: 'back-top-centre', copies: 1, how: 'drawn once' },
      { piece: 'back-top-side', copies: 2, how: 'drawn once' },
    ]);
  });

  it('nothing ticked is a problem, not an empty print', () => {
    const none = pieces.map((each): RoomAction => ({
      type: 'piece',
      piece: each,
      choice: { printed: false },
    }));
    expect(order(...none)).toMatchObject([{ field: 'order.pieces' }]);
  });

  it('what cannot be read is told once, and only where it has a meaning', () => {
    const typed: RoomAction = { type: 'typed', field: 'width', text: 'wide' };
    expect(order(typed)).toEqual(plainOrder);
    expect(order(typed, { type: 'chosen', choice: { paper: 'custom' } })).toMatchObject([
      { field: 'order.paper.width', code: 'not-read' },
    ]);
  });
});

describe('figures follow the unit', () => {
  it('a length keeps its meaning, what was never read its letters', () => {
    const room = after(
      { type: 'typed', field: 'margin', text: '1.27' },
      { type: 'typed', field: 'overlap', text: 'a thumb' },
      { type: 'typed', field: 'across', text: '97.2 mm' },
      { type: 'unit', unit: 'in' },
    );
    expect(room.lengths.margin).toEqual({ text: '1⁄2', read: { mm: 12.7 } });
    expect(room.lengths.overlap.text).toBe('a thumb');
    expect(room.lengths.across).toEqual({ text: '3.827', read: { mm: 97.2 } });
  });
});

describe('sheets left out', () => {
  it('belong to their plan: of another plan none is left out', () => {
    const once = after(
      { type: 'sheet', plan: 'one', name: 'A1' },
      { type: 'sheet', plan: 'one', name: 'A2' },
      { type: 'sheet', plan: 'one', name: 'A1' },
    );
    expect(once.leftOut).toEqual({ plan: 'one', names: ['A2'] });
    expect(roomChoices(once, { type: 'sheet', plan: 'two', name: 'B1' }).leftOut).toEqual({
      plan: 'two',
      names: ['B1'],
    });
  });
});
