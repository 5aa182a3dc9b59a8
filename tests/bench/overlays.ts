import { atCentreWaist } from '#shared/compare/alignment.ts';
import { compareDrafts } from '#shared/compare/compare-drafts.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { mostSizes, starterRules } from '#shared/regrade/grade-rules.ts';
import { nestOf } from '#shared/regrade/nest.ts';
import { fixedDepths } from '#shared/regrade/style-depths.ts';
import { middleBody } from '../support/middle-body.ts';
import type { Measured } from './redraw.ts';

const warmUp = 20;
const rounds = 60;

const noEase = { chest: 0, bust: 0, underbust: 0, waist: 0, topHip: 0, hip: 0 };

const at = (times: readonly number[], part: number): number => {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.floor((sorted.length - 1) * part)] ?? 0;
};

const rounded = (value: number): number => Math.round(value * 1000) / 1000;

/** Runs each in turn, so that whatever slows the machine slows all of them. */
function inTurn(routes: readonly ((round: number) => unknown)[]): readonly (readonly number[])[] {
  const taken = routes.map((): number[] => []);
  for (let round = 0; round < warmUp + rounds; round += 1) {
    for (const [which, route] of routes.entries()) {
      const start = performance.now();
      route(round);
      if (round >= warmUp) taken[which]?.push(performance.now() - start);
    }
  }
  return taken;
}

/** Two drafts over each other, and a nest of twelve, beside one redraft in the same run. */
export function benchOverlays(): readonly Measured[] {
  const cardOf = (round: number) => ({
    ...middleBody,
    bustGirth: middleBody.bustGirth + (round % 20),
  });
  // Large enough that five sizes under it are bodies too.
  const large = {
    ...middleBody,
    bustGirth: 1000,
    underbustGirth: 850,
    waistGirth: 820,
    hipGirth: 1080,
  };
  const base = draftGown({ card: large, style: {}, rules: balanced });
  const bare = draftGown({ card: large, style: { ease: noEase }, rules: balanced });
  const order = {
    rules: starterRules,
    smaller: 5,
    larger: mostSizes - 6,
    depths: fixedDepths,
  };
  const sizes = nestOf(base, order).sizes.length;
  const [redrafts = [], compared = [], nested = []] = inTurn([
    (round) => draftGown({ card: cardOf(round), style: {}, rules: balanced }),
    () => compareDrafts(base, bare, atCentreWaist),
    () => nestOf(base, order),
  ]);
  const redraft = at(redrafts, 0.5);
  const line = (name: string, times: readonly number[]): Measured => ({
    name,
    median: rounded(at(times, 0.5)),
    p95: rounded(at(times, 0.95)),
    unit: 'ms',
    against: `one redraft, ${rounded(redraft)} ms`,
    ratio: rounded(at(times, 0.5) / redraft),
  });
  return [
    line('a gown with and without ease laid over each other, areas and figures', compared),
    line(`a nest of ${sizes} sizes`, nested),
  ];
}
