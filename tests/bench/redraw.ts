import { balanced } from '#shared/drafting/house-rule-presets.ts';
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

/**
 * A full redraft of the demo gown (checks, drawing, finishing, proof), one measure changed each time,
 * beside a plain drawing of the same outlines as paper paths, turn by turn in one run.
 */
export async function benchRedraw(): Promise<readonly Measured[]> {
  const draw = await paperDrawing();
  const ours: number[] = [];
  const theirs: number[] = [];
  for (let round = 0; round < warmUp + rounds; round += 1) {
    const card = { ...middleBody, bustGirth: middleBody.bustGirth + (round % 20) };
    const start = performance.now();
    const draft = draftGown({ card, style: {}, rules: balanced });
    const drafted = performance.now();
    draw(draft.pieces);
    const drawn = performance.now();
    if (round < warmUp) continue;
    ours.push(drafted - start);
    theirs.push(drawn - drafted);
  }
  ours.sort((a, b) => a - b);
  theirs.sort((a, b) => a - b);
  const paper = share(theirs, 0.5);
  return [
    {
      name: 'full redraft of the demo gown in Node',
      median: rounded(share(ours, 0.5)),
      p95: rounded(share(ours, 0.95)),
      unit: 'ms',
      against: `plain paper paths of the same outlines, ${rounded(paper)} ms`,
      ratio: rounded(share(ours, 0.5) / paper),
    },
  ];
}
