import { spawn, spawnSync } from 'node:child_process';
import { root } from './project.mjs';

/** A command of ours that cannot go on; the message is for the person at the keyboard. */
export class StopError extends Error {}

/**
 * Runs a program in the project's folder with its output on the terminal.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{ env?: Record<string, string>, cwd?: string }} [options]
 * @returns {Promise<number>} its exit code, 1 where a signal ended it
 */
export function run(program, args, options = {}) {
  const env = { ...process.env, ...options.env };
  const child = spawn(program, args, { cwd: options.cwd ?? root, env, stdio: 'inherit' });
  return new Promise((resolve, reject) => {
    child.on('error', reject);
    child.on('exit', (code) => resolve(code ?? 1));
  });
}

/**
 * Runs a program that must succeed.
 * @param {string} what in plain words, for the message where it fails
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{ env?: Record<string, string>, cwd?: string }} [options]
 */
export async function must(what, program, args, options) {
  const code = await run(program, args, options);
  if (code !== 0) throw new StopError(`${what} failed (${program} ended with code ${code}).`);
}

/**
 * Runs a program quietly.
 * @param {string} program
 * @param {readonly string[]} args
 * @param {{ cwd?: string, env?: Record<string, string>, input?: string }} [options]
 */
export function quietly(program, args, options = {}) {
  const { cwd = root, env, input } = options;
  const done = spawnSync(program, args, {
    ...{ encoding: 'utf8', cwd, env: { ...process.env, ...env } },
    ...(input === undefined ? {} : { input }),
  });
  if (done.error) return { ok: false, output: done.error.message };
  return { ok: done.status === 0, output: `${done.stdout}${done.stderr}`.trim() };
}

/** @param {string} program */
export const isInstalled = (program) => quietly('sh', ['-c', `command -v ${program}`]).ok;

export const isRoot = () => process.getuid?.() === 0;

/**
 * Runs a command's main function: a plain message instead of a stack where a person can help.
 * @param {() => Promise<number>} main gives the exit code
 */
export async function command(main) {
  try {
    process.exitCode = await main();
  } catch (error) {
    if (!(error instanceof StopError)) throw error;
    console.error(`\n${error.message}`);
    process.exitCode = 1;
  }
}
