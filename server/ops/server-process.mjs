import { spawn } from 'node:child_process';
import { setTimeout as pause } from 'node:timers/promises';
import { root } from './project.mjs';
import { StopError } from './shell.mjs';

/**
 * Asks the health route who answers at an address.
 * @param {string} address
 * @returns {Promise<'ellwand' | 'another' | 'nobody'>}
 */
export async function whoAnswers(address) {
  try {
    const reply = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(3000) });
    const named = reply.headers.get('content-type')?.includes('json') ? await reply.text() : '';
    return named.includes('"ellwand"') ? 'ellwand' : 'another';
  } catch (error) {
    const cause = error instanceof Error ? error.cause : undefined;
    const refused = cause instanceof Error && 'code' in cause && cause.code === 'ECONNREFUSED';
    return refused ? 'nobody' : 'another';
  }
}

/**
 * Starts a server process of ours and waits until it answers.
 * @param {readonly string[]} args for node
 * @param {string} address at which it will answer
 * @param {Record<string, string>} env
 */
export async function startServer(args, address, env) {
  const child = spawn(process.execPath, args, {
    cwd: root,
    env: { ...process.env, ...env },
    stdio: 'inherit',
  });
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.on('exit', (code) => {
      // Without a code it was killed, which is no success.
      resolve(code ?? 1);
    });
  });
  const stop = async () => {
    child.kill('SIGTERM');
    await ended;
  };
  const until = Date.now() + 60_000;
  while (Date.now() < until) {
    if (child.exitCode !== null) {
      throw new StopError(`The server ended at once (code ${child.exitCode}).`);
    }
    if ((await whoAnswers(address)) === 'ellwand') return { ended, stop };
    await pause(50);
  }
  await stop();
  throw new StopError('The server did not answer within a minute.');
}
