import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { basename } from 'node:path';
import { describe, expect, it } from 'vitest';

const tracked = execFileSync('git', ['ls-files', '-z'], { encoding: 'utf8' })
  .split('\0')
  .filter((path) => path !== '' && existsSync(path));

const source = tracked.filter((path) => /\.(ts|tsx|mjs|js|css)$/.test(path));
const texts = tracked.filter((path) =>
  /\.(ts|tsx|mjs|js|css|json|md|html|svg|sql|csv)$/.test(path),
);

const holding = (paths: readonly string[], pattern: RegExp) =>
  paths.filter((path) => pattern.test(readFileSync(path, 'utf8')));

describe('the habits of the house', () => {
  it('a file name tells a reader what is in it', () => {
    const empty = /^(utils?|helpers?|misc|common|types|constants|manager|index)\.(tsx?|mjs)$/;
    const named = source.filter((path) => empty.test(basename(path)));
    expect(named.filter((path) => path !== 'server/index.ts')).toEqual([]);
  });

  it('file names are in kebab-case', () => {
    const kebab = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9-]+)*$/;
    const ours = source.filter((path) => /^(shared|server|src|tests|e2e)\//.test(path));
    expect(ours.filter((path) => !kebab.test(basename(path)))).toEqual([]);
  });

  it('no file is longer than a reader can hold', () => {
    const long = source.filter((path) => readFileSync(path, 'utf8').split('\n').length > 301);
    expect(long).toEqual([]);
  });

  it('nothing names a package registry or a folder of somebody’s machine', () => {
    const registry = /https?:\/\/[^\s/"']*(registry|artifactory|nexus|verdaccio)/;
    const machine = new RegExp(['', '(work|root|home/[a-z]+)', ''].join('/'));
    expect(holding(texts, registry)).toEqual([]);
    expect(holding(['package-lock.json'], /"resolved":/)).toEqual([]);
    expect(holding(source, machine)).toEqual([]);
  });

  it('no check is silenced and no test is skipped', () => {
    const silenced = new RegExp(
      [
        'eslint-' + 'disable',
        '@ts-' + '(ignore|nocheck|expect-error)',
        '\\b(it|test|describe)\\.(only|skip|todo)\\b',
      ].join('|'),
    );
    expect(holding(source, silenced)).toEqual([]);
  });
});
