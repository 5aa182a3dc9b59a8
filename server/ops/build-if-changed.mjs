import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './project.mjs';
import { must } from './shell.mjs';

/** All that a build reads. */
const sources = [
  'src',
  'shared',
  'server',
  'public',
  'index.html',
  'vite.config.ts',
  'package-lock.json',
];

const stamp = join(root, 'dist', 'built-from');

/**
 * @param {string} path
 * @returns {string[]}
 */
function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((each) => filesUnder(join(path, each)));
}

function sourcesHash() {
  const hash = createHash('sha256');
  for (const file of sources.flatMap((each) => filesUnder(join(root, each)))) {
    hash.update(file.slice(root.length)).update(readFileSync(file));
  }
  return hash.digest('hex');
}

/** Builds the client and the server where their sources are others than last time. */
export async function buildIfChanged() {
  const now = sourcesHash();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === now) return;
  console.log('Building …');
  await must('The build', process.execPath, [join(root, 'server/ops/build.mjs')]);
  writeFileSync(stamp, now);
}
