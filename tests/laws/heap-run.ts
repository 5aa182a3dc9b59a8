import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { middleBody } from '../support/middle-body.ts';

/*
 * Drafts a gown over and over in one process, each on a slightly other body, and writes the heap in
 * use after a fifth of the drafts and after all of them. Run with --expose-gc.
 */

const drafts = Number(process.argv[2] ?? 10_000);

/** Bytes that live on after everything unused was cleared away. */
function heapInUse(): number {
  const collect = globalThis.gc;
  if (!collect) throw new Error('run with --expose-gc');
  collect();
  collect();
  return process.memoryUsage().heapUsed;
}

let early = 0;
for (let count = 1; count <= drafts; count += 1) {
  const card = { ...middleBody, bustGirth: 900 + (count % 60), hipGirth: 980 + (count % 40) };
  const shaping = count % 2 === 0 ? 'princess' : 'darts';
  draftGown({ card, style: { shaping }, rules: balanced });
  if (count === Math.floor(drafts / 5)) early = heapInUse();
}
process.stdout.write(JSON.stringify({ drafts, early, late: heapInUse() }));
