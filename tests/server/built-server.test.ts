import { type ChildProcess, execFile, spawn } from 'node:child_process';
import { cp, mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { buildIfChanged } from '#server/ops/build-if-changed.mjs';
import { freePort } from '#server/ops/free-port.mjs';
import { whoAnswers } from '#server/ops/server-process.mjs';
import { post, print } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

const run = promisify(execFile);

let folder: string;
let neighbour: ServerUnderTest;
let child: ChildProcess;
let address: string;

/** Only what a server is delivered as: the build, and the packages it names for production. */
beforeAll(async () => {
  await buildIfChanged();
  folder = await mkdtemp(join(tmpdir(), 'delivered-'));
  for (const each of ['dist', 'package.json', 'package-lock.json', '.npmrc']) {
    await cp(each, join(folder, each), { recursive: true });
  }
  const quiet = ['--omit=dev', '--prefer-offline', '--no-audit', '--no-fund'];
  await run('npm', ['ci', ...quiet], { cwd: folder });
  neighbour = await startServer();
  const port = await freePort();
  address = `http://127.0.0.1:${port}`;
  child = spawn(process.execPath, [join(folder, 'dist/server/index.js')], {
    cwd: '/',
    stdio: 'inherit',
    env: {
      PATH: process.env['PATH'],
      NODE_ENV: 'production',
      LOG_LEVEL: 'warn',
      PORT: String(port),
      DATABASE_URL: neighbour.databaseUrl,
    },
  });
  const answers = async () => (await whoAnswers(address)) === 'ellwand';
  await vi.waitUntil(answers, { timeout: 60_000, interval: 100 });
}, 240_000);

afterAll(async () => {
  child.kill('SIGKILL');
  await neighbour.close();
  await rm(folder, { recursive: true, force: true });
});

describe('the built server, with production packages alone, from another working directory', () => {
  it('opens the page at every place, asked for anew each time', async () => {
    for (const path of ['/', '/try', '/some/place']) {
      const reply = await fetch(`${address}${path}`);
      expect(reply.status).toBe(200);
      expect(reply.headers.get('content-type')).toContain('text/html');
      expect(reply.headers.get('cache-control')).toBe('no-cache');
    }
  });

  it('lets browsers keep the assets, whose names change with their content', async () => {
    const [asset] = await readdir(join(folder, 'dist/client/assets'));
    const reply = await fetch(`${address}/assets/${asset ?? ''}`);
    expect(reply.status).toBe(200);
    expect(reply.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
  });

  it.each(['/assets/gone.js', '/gone.png', '/assets/..%2f..%2fpackage.json', '/.npmrc'])(
    '%s is not the page and not a file of ours',
    async (path) => {
      const reply = await fetch(`${address}${path}`);
      expect(reply.status).toBe(404);
      expect(reply.headers.get('content-type')).toContain('json');
    },
  );

  it.each([
    [416, 'range', 'bytes=99999999-'],
    [412, 'if-match', '"another"'],
    [412, 'if-unmodified-since', 'Thu, 01 Jan 1970 00:00:00 GMT'],
  ])('says %i where the file does not meet %s', async (status, header, value) => {
    const [asset] = await readdir(join(folder, 'dist/client/assets'));
    for (const path of [`/assets/${asset ?? ''}`, '/']) {
      const reply = await fetch(`${address}${path}`, { headers: { [header]: value } });
      expect(reply.status).toBe(status);
      expect(reply.headers.get('content-type')).toContain('json');
      expect(reply.headers.get('cache-control')).toBe('no-store');
    }
  });

  it('reads its samples from the database', async () => {
    const reply = await fetch(`${address}/api/samples`);
    expect(await reply.text()).toContain('tamsin');
  });

  it.each(['tiles', 'chalk-sheet'])(
    'prints %s with the fonts it was delivered with',
    async (what) => {
      const reply = await post(`${address}/api/prints/${what}`, print);
      expect(reply.status).toBe(200);
      expect((await reply.arrayBuffer()).byteLength).toBeGreaterThan(5000);
    },
  );

  it('closes in good order when it is asked to', async () => {
    const ended = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGTERM');
    expect(await ended).toBe(0);
  });
});
