import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { keep } from './project.mjs';

/** @typedef {{ passed: number, failed: number }} Count */

/**
 * The parts of vitest's and of playwright's report that are read here.
 * @typedef {{ numPassedTests: number, numFailedTests: number, stats?: undefined }} VitestReport
 * @typedef {{ stats: { expected: number, unexpected: number, flaky: number } }} PlaywrightReport
 */

/** @type {(text: string) => VitestReport | PlaywrightReport} */
const parseReport = JSON.parse;

const folder = join(keep, 'reports');

/** Old reports must not be counted again. */
export function clearReports() {
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true, mode: 0o755 });
}

/** @param {string} stage */
export const reportPath = (stage) => join(folder, `${stage}.json`);

/**
 * What a stage's report says. A stage that failed without a failed test (a file that does not
 * compile, a browser that does not start, no report at all) counts as one failure.
 * @param {string} stage
 * @param {boolean} succeeded
 * @returns {Count}
 */
export function countOf(stage, succeeded) {
  const least = succeeded ? 0 : 1;
  if (!existsSync(reportPath(stage))) return { passed: 0, failed: least };
  const report = parseReport(readFileSync(reportPath(stage), 'utf8'));
  const [passed, failed] =
    report.stats === undefined
      ? [report.numPassedTests, report.numFailedTests]
      : [report.stats.expected + report.stats.flaky, report.stats.unexpected];
  return { passed, failed: Math.max(failed, least) };
}
