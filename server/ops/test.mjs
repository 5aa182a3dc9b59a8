import { runBrowserTests } from './browser-tests.mjs';
import { buildIfChanged } from './build-if-changed.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { StopError, command, run } from './shell.mjs';
import { clearReports, countOf, reportPath } from './test-report.mjs';

/** @typedef {{ name: string, minutes: number, passed: number, failed: number }} Outcome */

/**
 * @param {string} stage
 * @param {readonly string[]} projects
 * @param {Record<string, string>} [env]
 */
function vitest(stage, projects, env = {}) {
  const chosen = projects.flatMap((each) => ['--project', each]);
  const reports = [
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${reportPath(stage)}`,
  ];
  return run('npx', ['vitest', 'run', ...chosen, ...reports], { env });
}

/** @type {readonly [string, () => Promise<number>][]} */
const stages = [
  ['types', () => run('npm', ['run', '--silent', 'types'])],
  ['lint', () => run('npm', ['run', '--silent', 'lint'])],
  ['format', () => run('npm', ['run', '--silent', 'format:check'])],
  ['dead code', () => run('npm', ['run', '--silent', 'knip'])],
  ['unit', () => vitest('unit', ['unit', 'screens', 'architecture'])],
  ['laws', () => vitest('laws', ['laws'], { LAW_RUNS: '1000' })],
  ['build', () => buildIfChanged().then(() => 0)],
  ['server', () => vitest('server', ['server'])],
  ['browser', () => runBrowserTests([], { PLAYWRIGHT_REPORT: reportPath('browser') })],
];

/**
 * Runs a stage to its end, whatever befalls it, so that later stages are still counted.
 * @param {string} name
 * @param {() => Promise<number>} work
 * @returns {Promise<Outcome>}
 */
async function outcomeOf(name, work) {
  console.log(`\n== ${name}`);
  const start = performance.now();
  let code = 1;
  try {
    code = await work();
  } catch (error) {
    console.error(error instanceof StopError ? error.message : error);
  }
  const minutes = (performance.now() - start) / 60_000;
  return { name, minutes, ...countOf(name, code === 0) };
}

/** @param {readonly Outcome[]} outcomes */
function tell(outcomes) {
  console.log('\nMinutes by stage');
  for (const each of outcomes) {
    const verdict = each.failed > 0 ? `FAILED (${each.failed})` : 'ok';
    console.log(`  ${each.name.padEnd(12)} ${each.minutes.toFixed(2).padStart(6)}  ${verdict}`);
  }
  const sum = (/** @type {'minutes' | 'passed' | 'failed'} */ key) =>
    outcomes.reduce((total, each) => total + each[key], 0);
  console.log(`  ${'all'.padEnd(12)} ${sum('minutes').toFixed(2).padStart(6)}`);
  const broken = outcomes.filter((each) => each.failed > 0).map((each) => each.name);
  if (broken.length > 0)
    console.log(
      `\nNot green: ${broken.join(', ')}. The reasons stand above, under == ${broken[0]}.`,
    );
  console.log(`\n${sum('passed')} passed, ${sum('failed')} failed`);
  return sum('failed') === 0 && sum('passed') > 0 ? 0 : 1;
}

await command(async () => {
  clearReports();
  const outcomes = [];
  const install = () =>
    ensureNpmPackages()
      .then(() => ensureDebianPackages('test'))
      .then(() => 0);
  outcomes.push(await outcomeOf('install', install));
  const ready = outcomes.every((each) => each.failed === 0);
  for (const [name, work] of ready ? stages : []) outcomes.push(await outcomeOf(name, work));
  return tell(outcomes);
});
