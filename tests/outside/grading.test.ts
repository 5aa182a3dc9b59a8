import { describe, expect, it } from 'vitest';
import { pointMoves } from '#shared/compare/points.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { starterRules } from '#shared/regrade/grade-rules.ts';
import { nestOf } from '#shared/regrade/nest.ts';
import { middleBody } from '../support/middle-body.ts';

/**
 * How points of a bodice block move for a step of 40: found by drafting sizes 12 and 14 of a published
 * block (ALD, from memory: to be verified), from the centre lines and the nape line, mm. Its bust dart opens with
 * the bust (a table), so ours is drafted by that rule here. Nested lines should agree with a fresh draft
 * within 2 (common practice, no source).
 */
const published = [
  { piece: 'bodice-back', title: 'corner of neck and shoulder a', x: 2.0, y: 0 },
  { piece: 'bodice-back', title: 'corner of shoulder b and armhole', x: 4.3, y: 1.0 },
  { piece: 'bodice-back', title: 'corner of armhole and side', x: 8.0, y: 5.0 },
  { piece: 'bodice-back', title: 'corner of waist a and centre', x: 0, y: 5.0 },
  // In front the source counts from the centre back; the centre front moves by 20 there.
  { piece: 'bodice-front', title: 'corner of centre and neck', x: 0, y: 2.0 },
  { piece: 'bodice-front', title: 'corner of neck and shoulder a', x: 20 - 18, y: 0 },
  { piece: 'bodice-front', title: 'tip of the bust dart', x: 20 - 15.5, y: 5.0 },
  { piece: 'bodice-front', title: 'corner of bust mouth and shoulder b', x: 20 - 12, y: 0.2 },
  { piece: 'bodice-front', title: 'corner of shoulder b and armhole', x: 20 - 9.6, y: 1.0 },
  { piece: 'bodice-front', title: 'corner of waist a and centre', x: 0, y: 5.0 },
] as const;

const within = 2;

describe('one step of the starter rules on the bodice block, beside the published figures', () => {
  const base = draftAny({
    garment: 'bodice-block',
    // Size 12 of the source, as far as it gives measures (from memory); the rest invented by us.
    card: { ...middleBody, bustGirth: 880, underbustGirth: 750, waistGirth: 680, hipGirth: 940 },
    style: { bustDartRule: 'shoulderTable' },
    rules: balanced,
  });
  const [first, second] = nestOf(base, {
    rules: starterRules,
    smaller: 0,
    larger: 1,
    depths: {},
  }).sizes.map(({ draft }) => draft);
  if (!first || !second) throw new Error('a size is missing');
  const waist = second.bodyLevels.waist - first.bodyLevels.waist;
  const nape = second.bodyLevels.nape - first.bodyLevels.nape;
  const moves = pointMoves(first, second, { on: 'point', point: 'centre-waist' });

  it.each(published)('$piece, $title', ({ piece, title, x, y }) => {
    const move = moves.find((each) => each.piece === piece && each.title === title);
    if (!move) throw new Error('no such point');
    const [dx, dy] = [move.to.x - move.from.x, move.to.y - move.from.y + waist - nape];
    expect(Math.abs(dx - x), `moves ${dx} across`).toBeLessThanOrEqual(within);
    expect(Math.abs(dy - y), `moves ${dy} down`).toBeLessThanOrEqual(within);
  });

  it('both halves of front and back grow a quarter of the step at the side', () => {
    // Published (fashion-incubator, seen): half front and half back each grow g/4 at the side.
    const side = (piece: string) => {
      const move = moves.find(
        (each) => each.piece === piece && each.title.includes('armhole and side'),
      );
      return move ? move.to.x - move.from.x : Number.NaN;
    };
    expect(side('bodice-front')).toBeCloseTo(40 / 4, 0);
    expect(side('bodice-back')).toBeCloseTo(40 / 4, 0);
  });

  it('the steps of bust, waist and hip are those between the classes of EN 13402-3', () => {
    // Class mid-values 76 to 104 (from memory).
    const classes = {
      bustGirth: [76, 80, 84, 88, 92, 96, 100, 104],
      waistGirth: [60, 64, 68, 72, 76, 80, 84, 88],
      hipGirth: [84, 88, 92, 96, 100, 104, 108, 112],
    } as const;
    for (const [measure, values] of Object.entries(classes)) {
      const steps = values.slice(1).map((value, k) => 10 * (value - (values[k] ?? Number.NaN)));
      expect(new Set(steps)).toEqual(new Set([Reflect.get(starterRules, measure)]));
    }
  });
});
