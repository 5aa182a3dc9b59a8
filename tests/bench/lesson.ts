import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { stepPicture } from '#shared/lesson/step-picture.ts';
import { spoken } from '#shared/lesson/spoken.ts';
import { middleBody } from '../support/middle-body.ts';
import { type Measured, rounded, share } from './redraw.ts';

const warmUp = 100;
const rounds = 300;

/**
 * Replaying to any step of the demo gown (its picture from nothing, and its sentence with the sources of
 * its numbers) beside one redraft of it, turn by turn in one run; `ratio` is of the two medians.
 */
export function benchReplay(): readonly Measured[] {
  const steps: number[] = [];
  const redrafts: number[] = [];
  for (let round = 0; round < warmUp + rounds; round += 1) {
    const card = { ...middleBody, bustGirth: middleBody.bustGirth + (round % 20) };
    const start = performance.now();
    const draft = draftGown({ card, style: {}, rules: balanced });
    const drafted = performance.now();
    // Steps are leapt to in no order, as a tutor who is asked about one does.
    const place = (round * 17) % draft.steps.length;
    const step = draft.steps[place];
    const picture = stepPicture(draft, place);
    const words = step ? spoken(step.said, step, draft.body) : [];
    const told = performance.now();
    if (picture === undefined || words.length === 0) throw new Error('a step tells nothing');
    if (round < warmUp) continue;
    redrafts.push(drafted - start);
    steps.push(told - drafted);
  }
  steps.sort((a, b) => a - b);
  redrafts.sort((a, b) => a - b);
  const redraft = share(redrafts, 0.5);
  return [
    {
      name: 'replay to any step of the demo gown, picture and sentence',
      median: rounded(share(steps, 0.5)),
      p95: rounded(share(steps, 0.95)),
      unit: 'ms',
      against: `one redraft of it, ${rounded(redraft)} ms`,
      ratio: rounded(share(steps, 0.5) / redraft),
    },
  ];
}
