import { type ChildProcess, fork, spawn } from 'node:child_process';
import { cpSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { buildIfChanged } from '#server/ops/build-if-changed.mjs';
import { startCluster } from '#server/ops/cluster.mjs';
import { postgres } from '#server/ops/database-user.mjs';
import { freePort } from '#server/ops/free-port.mjs';
import { keep } from '#server/ops/project.mjs';
import { whoAnswers } from '#server/ops/server-process.mjs';
import type { Ledger, Word } from './ledger.ts';
import { reckon } from './reckoning.ts';
import { seeded } from './seeded.ts';

/**
 * A browser autosaves and sends again whatever is not answered, while the server is killed and then
 * the database stopped without warning, at random moments. Afterwards every acknowledged save must
 * be there, and none twice.
 */
const seed = Number(process.env['SEED'] ?? Math.floor(Math.random() * 1_000_000));
const saves = Number(process.env['SAVES'] ?? 1000);
const gowns = 4;
const chance = seeded(seed);

await buildIfChanged();
const name = `durability-${process.pid}`;
/** A copy, so that a build meanwhile changes nothing here. */
const built = join(keep, `${name}-build`, 'dist');
cpSync('dist', built, { recursive: true });
const cluster = await startCluster(name, { durable: true });
const port = await freePort();
const address = `http://127.0.0.1:${port}`;

let server: ChildProcess | undefined;
let killing = false;
const figures = { serverKills: 0, databaseStops: 0, serverFell: 0 };

async function openServer(): Promise<void> {
  const child = spawn(process.execPath, [join(built, 'server', 'index.js')], {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      PATH: process.env['PATH'],
      NODE_ENV: 'production',
      LOG_LEVEL: 'fatal',
      PORT: String(port),
      DATABASE_URL: cluster.url,
      SAVES_PER_MINUTE: '1000000',
      REQUESTS_PER_MINUTE: '1000000',
    },
  });
  server = child;
  child.once('exit', () => {
    if (!killing) figures.serverFell += 1;
  });
  while ((await whoAnswers(address)) !== 'ellwand') await pause(20);
}

async function killServer(): Promise<void> {
  const child = server;
  const gone = new Promise((resolve) => child?.once('exit', resolve));
  killing = true;
  child?.kill('SIGKILL');
  await gone;
  killing = false;
  figures.serverKills += 1;
}

function stopDatabase(): void {
  const data = join(cluster.folder, 'data');
  const log = join(cluster.folder, 'log');
  const done = postgres('pg_ctl', ['restart', '-D', data, '-m', 'immediate', '-w', '-l', log]);
  if (!done.ok) throw new Error(`The database did not come back:\n${done.output}`);
  figures.databaseStops += 1;
}

/** Runs the browser to its end and does it harm on the way: first the server, then the database. */
async function autosaveUnderFire(): Promise<Ledger> {
  let acknowledged = -1;
  let ledger: Ledger | undefined;
  const browser = fork(
    join(import.meta.dirname, 'autosaving.ts'),
    [address, String(seed), String(saves), String(gowns)],
    { execArgv: ['--import', 'tsx'] },
  );
  const ended = new Promise<number>((resolve) => {
    browser.once('exit', (code) => {
      resolve(code ?? 1);
    });
  });
  browser.on('message', (message) => {
    const word = wordOf(message);
    if ('ledger' in word) ledger = word.ledger;
    else acknowledged = word.acknowledged;
  });
  const isOver = () => ledger !== undefined || browser.exitCode !== null;
  while (acknowledged < 0 && !isOver()) await pause(10);
  while (!isOver()) {
    await pause(300 + 2200 * chance());
    if (isOver()) break;
    if (server?.exitCode !== null) await openServer();
    if (acknowledged < saves / 2) {
      await killServer();
      await pause(500 * chance());
      await openServer();
    } else stopDatabase();
  }
  await ended;
  if (ledger === undefined) throw new Error('The browser ended without its ledger.');
  return ledger;
}

/** Only the browser's process writes to this one. */
function wordOf(message: unknown): Word {
  return message as Word;
}

console.log(`Seed ${seed} (SEED=${seed} npm run test:durability draws the same moments)`);
try {
  await openServer();
  const start = performance.now();
  const ledger = await autosaveUnderFire();
  const seconds = (performance.now() - start) / 1000;
  const { lost, doubled } = await reckon(cluster.url, ledger);
  console.table({
    'server killed': figures.serverKills,
    'database stopped': figures.databaseStops,
    'server fell by itself': figures.serverFell,
    'saves sent again': ledger.retries,
    'of them done before, unheard': ledger.unheard,
    'saves acknowledged': ledger.acknowledged.length,
    lost,
    doubled,
    'refused for good': ledger.refused.length,
    seconds: Math.round(seconds),
  });
  for (const each of ledger.refused) console.log(each);
  const harmed = figures.serverKills > 0 && figures.databaseStops > 0;
  const heardLate = saves < 1000 || ledger.unheard > 0;
  const enough = ledger.acknowledged.length >= saves && harmed && heardLate;
  const holds = lost === 0 && doubled === 0 && figures.serverFell === 0 && enough;
  console.log(holds ? 'Every acknowledged save is there, none twice.' : 'NOT durable: see above.');
  process.exitCode = holds ? 0 : 1;
} finally {
  killing = true;
  server?.kill('SIGKILL');
  cluster.stop();
  for (const each of [cluster.folder, join(keep, name), join(keep, `${name}-build`)]) {
    rmSync(each, { recursive: true, force: true });
  }
}
