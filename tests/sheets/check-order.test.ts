import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { checkOrder } from '#shared/sheets/check-order.ts';
import { type PrintOrder, orderLimits, plainOrder } from '#shared/sheets/print-order.ts';
import { waysToDraw } from '#shared/sheets/ways-to-draw.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: balanced });
const check = (order: Partial<PrintOrder>) => checkOrder({ ...plainOrder, ...order }, pieces);
const fields = (order: Partial<PrintOrder>) => check(order).map(({ field }) => field);

describe('an order for a gown', () => {
  it('has nothing wrong with it as it stands at first', () => {
    expect(check({})).toEqual([]);
    expect(check({ pieces: 'bodice-toile' })).toEqual([]);
  });

  it('takes every margin and overlap within the bounds, and none beyond', () => {
    const { margin, overlap } = orderLimits;
    fc.assert(
      fc.property(fc.double({ min: -10, max: 60, noNaN: true }), (mm) => {
        const inside = ({ least, most }: { least: number; most: number }) =>
          mm >= least - 1 && mm <= most + 1;
        if (!inside(margin)) expect(fields({ margin: mm })).toEqual(['order.margin']);
        if (!inside(overlap)) expect(fields({ overlap: mm })).toEqual(['order.overlap']);
        if (mm >= margin.least && mm <= margin.most) expect(fields({ margin: mm })).toEqual([]);
        if (mm >= overlap.least && mm <= overlap.most) expect(fields({ overlap: mm })).toEqual([]);
      }),
    );
  });

  it('names the side of a sheet of one’s own that is wrong, whichever way it was typed', () => {
    expect(fields({ paper: { width: 330, height: 480 } })).toEqual([]);
    expect(fields({ paper: { width: 480, height: 330 } })).toEqual([]);
    expect(fields({ paper: { width: 150, height: 300 } })).toEqual(['order.paper.width']);
    expect(fields({ paper: { width: 300, height: 150 } })).toEqual(['order.paper.height']);
    expect(fields({ paper: { width: Number.NaN, height: 300 } })).toContain('order.paper.height');
  });

  it('says bound and remedy in the reader’s unit', () => {
    const [problem] = check({ overlap: 60 });
    expect(problem && speak(problem.said, 'cm')).toBe(
      'The overlap 6.0 cm must lie between 0.5 cm and 2.5 cm: 1.0 cm holds a glue strip well.',
    );
    expect(problem && speak(problem.said, 'in')).toMatch(/overlap 2\u00a03⁄8 in must lie between/);
  });

  it('takes each piece in every way it can be drawn, and in no other', () => {
    for (const piece of pieces) {
      const ways = waysToDraw(piece);
      for (const how of ['drawn once', 'mirrored pair', 'on fold', 'opened out'] as const) {
        const found = fields({ pieces: [{ piece: piece.name, copies: 1, how }] });
        expect(found).toEqual(ways.includes(how) ? [] : ['order.pieces.0.how']);
      }
    }
  });

  it('refuses no piece, a piece nobody drafted, and a toile of a garment without a top', () => {
    expect(fields({ pieces: [] })).toEqual(['order.pieces']);
    const hood = { piece: 'hood', copies: 1, how: 'drawn once' } as const;
    expect(fields({ pieces: [hood] })).toEqual(['order.pieces.0.piece']);
    const skirt = pieces.filter(({ part }) => part !== 'top');
    const order: PrintOrder = { ...plainOrder, pieces: 'bodice-toile' };
    expect(checkOrder(order, skirt).map(({ field }) => field)).toEqual(['order.pieces']);
  });
});

describe('an order of very many outlines', () => {
  const asked = (copies: number) =>
    pieces.map((piece) => ({ piece: piece.name, copies, how: waysToDraw(piece)[0] }));

  it('is refused where a piece is listed twice', () => {
    const [first] = asked(1);
    expect(first && check({ pieces: [first, first] }).map(({ code }) => code)).toEqual([
      'piece-twice',
    ]);
  });

  it('is refused where there are more than are laid out together, pairs counted twice', () => {
    const lined = draftGown({
      card: middleBody,
      style: { lining: 'lined', facing: 'faced' },
      rules: balanced,
    }).pieces;
    const order = (copies: number): PrintOrder => ({
      ...plainOrder,
      pieces: lined.map((piece) => ({
        piece: piece.name,
        copies,
        how: waysToDraw(piece).includes('mirrored pair') ? 'mirrored pair' : 'on fold',
      })),
    });
    expect(checkOrder(order(1), lined)).toEqual([]);
    expect(checkOrder(order(6), lined).map(({ field }) => field)).toEqual(['order.pieces']);
  });
});
