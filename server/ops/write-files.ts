import { randomBytes } from 'node:crypto';
import {
  accessSync,
  constants,
  mkdirSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join, resolve } from 'node:path';

/** A folder, or that there is nothing of the name; what is there and no folder is an error. */
function isFolder(path: string): boolean {
  const there = statSync(path, { throwIfNoEntry: false });
  if (there !== undefined && !there.isDirectory()) throw new Error(`${path} is no folder.`);
  return there !== undefined;
}

/** Makes a folder and those above it one by one: Node's own way never ends under /proc. */
function makeFolder(path: string): void {
  if (isFolder(path)) {
    accessSync(path, constants.W_OK | constants.X_OK);
    return;
  }
  makeFolder(dirname(path));
  mkdirSync(path);
}

/**
 * Writes files into a folder, all of them or none that is half written: under a passing name first,
 * then in place of whatever bears the name, so that a link is replaced and not followed. Throws
 * where it cannot.
 */
export function writeFiles(
  folder: string,
  files: Readonly<Record<string, string | Uint8Array>>,
): void {
  makeFolder(resolve(folder));
  const mark = randomBytes(6).toString('hex');
  const passing = (name: string) => join(folder, `.${name}.${mark}`);
  try {
    for (const [name, content] of Object.entries(files)) {
      writeFileSync(passing(name), content, { flag: 'wx' });
    }
    for (const name of Object.keys(files)) renameSync(passing(name), join(folder, name));
  } finally {
    for (const name of Object.keys(files)) rmSync(passing(name), { force: true });
  }
}
