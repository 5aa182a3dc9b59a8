import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { middleBody } from '../support/middle-body.ts';
import { paperDrawing } from './paper-paths.ts';

/** One line of the benchmark's report; `ratio` is ours as a part of what it is held against, medians. */
export type Measured = {
  readonly name: string;
  readonly median: number;
  readonly p95: number;
  readonly unit: 'ms';
  readonly against: string;
  readonly ratio: number;
};

const warmUp = 300;
const rounds = 600;

export const share = (sorted: readonly number[], part: number): number =>
  sorted[Math.floor((sorted.length - 1) * part)] ?? 0;

export const rounded = (value: number): number => Math.round(value * 1000) / 1000;

/** Everything a style card can ask for at once that goes together. */
const richest: StyleCard = {
  sleeve: 'pleatedBand',
  flare: 'godets',
  closure: 'laced',
  facing: 'faced',
  lining: 'lined',
  boning: 'boned',
  train: 200,
};

/**
 * A full redraft of the demo gown and of the richest (checks, drawing, finishing, proof), one measure changed each time,
 * beside a plain drawing of the same outlines as paper paths, turn by turn in one run.
 */
export async function benchRedraw(): Promise<readonly Measured[]> {
  const draw = await paperDrawing();
  const ours: number[] = [];
  const theirs: number[] = [];
  const richer: number[] = [];
  for (let round = 0; round < warmUp + rounds; round += 1) {
    const card = { ...middleBody, bustGirth: middleBody.bustGirth + (round % 20) };
    const start = performance.now();
    const draft = draftGown({ card, style: {}, rules: balanced });
    const drafted = performance.now();
    draw(draft.pieces);
    const drawn = performance.now();
    draftGown({ card, style: richest, rules: balanced });
    const rich = performance.now();
    if (round < warmUp) continue;
    ours.push(drafted - start);
    theirs.push(drawn - drafted);
    richer.push(rich - drawn);
  }
  for (const each of [ours, theirs, richer]) each.sort((a, b) => a - b);
  const paper = share(theirs, 0.5);
  const demo = share(ours, 0.5);
  return [
    {
      name: 'full redraft of the demo gown in Node',
      median: rounded(demo),
      p95: rounded(share(ours, 0.95)),
      unit: 'ms',
      against: `plain paper paths of the same outlines, ${rounded(paper)} ms`,
      ratio: rounded(demo / paper),
    },
    {
      name: 'full redraft of the richest gown in Node',
      median: rounded(share(richer, 0.5)),
      p95: rounded(share(richer, 0.95)),
      unit: 'ms',
      against: `full redraft of the demo gown, ${rounded(demo)} ms`,
      ratio: rounded(share(richer, 0.5) / demo),
    },
  ];
}
