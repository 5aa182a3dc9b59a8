import { cpSync, existsSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { keep, root } from './project.mjs';
import { command, must } from './shell.mjs';

const bin = join(root, 'node_modules', '.bin');

/** Entries of the server that run as programs of their own. */
const entries = [
  'server/index.ts',
  'server/ops/draft.ts',
  'server/drafting/draft-worker.ts',
  'server/features/print/print-worker.ts',
];

/** What the server reads beside its code, and where the bundle looks for it. */
const companions = [
  ['server/database/migrations', 'server/migrations'],
  ['server/features/print/fonts', 'server/fonts'],
];

/** @param {string} folder */
async function buildServer(folder) {
  await must('Building the server', join(bin, 'esbuild'), [
    ...entries,
    '--bundle',
    '--platform=node',
    '--target=node20',
    '--format=esm',
    '--packages=external',
    '--sourcemap',
    '--entry-names=[name]',
    `--outdir=${join(folder, 'server')}`,
    '--log-level=warning',
  ]);
  for (const [from = '', to = ''] of companions) {
    if (existsSync(join(root, from)))
      cpSync(join(root, from), join(folder, to), { recursive: true });
  }
}

/** Builds beside the old build and swaps at the end, so that a running server is never half new. */
await command(async () => {
  // What is served is always the production build, also where the tests start it.
  process.env['NODE_ENV'] = 'production';
  const fresh = join(keep, `build-${process.pid}`);
  const built = join(root, 'dist');
  try {
    const client = [
      'build',
      '--outDir',
      join(fresh, 'client'),
      '--emptyOutDir',
      '--logLevel',
      'warn',
    ];
    await must('Building the client', join(bin, 'vite'), client);
    await buildServer(fresh);
    rmSync(built, { recursive: true, force: true });
    renameSync(fresh, built);
  } finally {
    rmSync(fresh, { recursive: true, force: true });
  }
  return 0;
});
