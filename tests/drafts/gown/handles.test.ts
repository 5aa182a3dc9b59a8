import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { handleKeys, type Handle } from '#shared/drafting/construction.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { topLineShapes } from '#shared/drafts/gown/style-card.ts';
import { styleLimits } from '#shared/drafts/gown/style-limits.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft, DraftInputs } from '#shared/engine/draft.ts';
import { dot, subtract } from '#shared/geometry/point.ts';
import { bothShapings } from '../../laws/random-gown.ts';
import { middleBody } from '../../support/middle-body.ts';

const keysOf = (draft: Draft) => draft.handles.map(({ key }) => key);

const drawnOrNot = (inputs: DraftInputs): Draft | undefined => {
  try {
    return draftGown(inputs);
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
};

/** The handle after its value has grown by so much, where that is within its bounds and can be drawn. */
function grown(draft: Draft, { key }: Handle, by: number): Handle | undefined {
  const value = draft.style[key] + by;
  const { style } = draft.inputs;
  const { min, max } = styleLimits(draft.body, draft.bodyLevels, style)[key];
  if (value < min || value > max) return undefined;
  const next = drawnOrNot({ ...draft.inputs, style: { ...style, [key]: value } });
  return next?.handles.find((each) => each.key === key);
}

describe('the handles of a gown', () => {
  it('are all of them on a sweetheart, and each lies on the piece it names', () => {
    const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
    expect(keysOf(draft)).toEqual(handleKeys);
    for (const handle of draft.handles) {
      const piece = draft.pieces.find(({ name }) => name === handle.piece);
      const ends = [
        ...(piece?.edges ?? []).flatMap(({ path }) => path.flatMap(({ from, to }) => [from, to])),
        ...(piece?.darts ?? []).flatMap(({ centreLeg }) => centreLeg.map(({ to }) => to)),
      ];
      expect(ends).toContainEqual(handle.at);
    }
  });

  it('of a straight top line move its drop at the centre, as there is neither dip nor peak', () => {
    const style = { topLine: 'straight' } as const;
    const draft = draftGown({ card: middleBody, style, rules: balanced });
    expect(keysOf(draft)).not.toContain('neckDepth');
    expect(keysOf(draft)).not.toContain('neckWidth');
    expect(draft.handles.find(({ key }) => key === 'topDrop')?.at.x).toBe(0);
  });

  it.each(topLineShapes)('follow their values by what they say, on a %s line', (topLine) => {
    const draft = draftGown({ card: middleBody, style: { topLine }, rules: balanced });
    for (const handle of draft.handles) {
      const next = grown(draft, handle, 1) ?? grown(draft, handle, -1);
      expect(next?.piece).toBe(handle.piece);
    }
  });

  it('follow their values by what they say, on any body in any style', () => {
    const seen = new Map<string, number>();
    fc.assert(
      fc.property(bothShapings, (inputs) => {
        for (const each of inputs) {
          const draft = drawnOrNot(each);
          for (const handle of draft?.handles ?? []) {
            const isPeak = handle.key === 'neckWidth' || handle.key === 'topDrop';
            // A peak goes round a curve, straight only for a small step; what is trued goes straight, to a thousandth.
            const step = isPeak ? 0.01 : 1;
            const next = draft && grown(draft, handle, step);
            // A peak that steps over the princess seam goes on from the other panel.
            if (next?.piece !== handle.piece) continue;
            const travel = dot(subtract(next.at, handle.at), handle.along);
            const way = subtract(next.at, handle.at);
            // Where a laced back is cut away, the edge that is left leans.
            const leans = handle.key === 'backDepth' && draft?.style.closure === 'laced';
            const bound = leans ? 5e-2 : isPeak ? 1e-3 : 1e-6;
            expect(Math.abs((travel * handle.perMillimetre) / step - 1), handle.key).toBeLessThan(
              bound,
            );
            // A peak goes nowhere else; side, knee and tip slide along lines of their own.
            const aside = Math.hypot(way.x, way.y) ** 2 - travel ** 2;
            if (isPeak) {
              expect(Math.sqrt(Math.max(0, aside)) / step, handle.key).toBeLessThan(1e-2);
            }
            seen.set(handle.key, (seen.get(handle.key) ?? 0) + 1);
          }
        }
      }),
      { numRuns: 15, seed: 20_261_201, endOnFailure: true },
    );
    expect([...seen.keys()].sort()).toEqual([...handleKeys].sort());
  });
});
