import { spawnSync } from 'node:child_process';
import { expect, test } from 'vitest';
import { bundle } from '../support/bundle.ts';
import { lawRuns } from './law-runs.ts';

type Heap = { readonly early: number; readonly late: number };

/** What heap-run.ts writes. */
const asHeap = (written: string): Heap => JSON.parse(written) as Heap;

const mebibytes = (bytes: number): string => (bytes / 2 ** 20).toFixed(2);

test('ten thousand drafts in one process leave the heap as flat as two thousand did', async () => {
  const drafts = 10 * lawRuns;
  const script = await bundle(new URL('heap-run.ts', import.meta.url));
  const run = spawnSync(process.execPath, ['--expose-gc', script, String(drafts)], {
    encoding: 'utf8',
  });
  expect(run.stderr).toBe('');
  const { early, late } = asHeap(run.stdout);
  process.stdout.write(
    `heap after ${drafts / 5} drafts ${mebibytes(early)} MiB, after ${drafts} ${mebibytes(late)} MiB\n`,
  );
  // A draft kept by mistake weighs over 100 kB: 8,000 of them, 800 MiB.
  expect(late - early).toBeLessThan(2 * 2 ** 20);
});
