/** The checks of npm run verify and npm test, and the counts that their runners give. */

import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { nextEnvironment } from './build.mjs';
import { runCommand } from './command.mjs';
import { data } from './paths.mjs';

const node = process.execPath;
const bin = (name) => join('node_modules', '.bin', name);
const reports = join(data, 'reports');

/** What has been counted so far. A check without a runner's count counts as one. */
export const tally = { passed: 0, failed: 0 };

/** Runs one check and prints how long it took. `count` reads the runner's own counts. */
export async function check(name, work, count = () => null) {
  const started = Date.now();
  let failure;
  try {
    failure = (await work()) ? undefined : 'failed';
  } catch (error) {
    failure = error.message;
  }
  const counted = count();
  tally.passed += counted?.passed ?? (failure ? 0 : 1);
  // A runner that broke down without a failing test has still failed.
  tally.failed += Math.max(counted?.failed ?? 0, failure ? 1 : 0);
  const seconds = ((Date.now() - started) / 1000).toFixed(1);
  console.log(`${failure ? '✗' : '✓'} ${name}  ${seconds} s${failure ? `  ${failure}` : ''}`);
  return !failure;
}

const run = async (command, args, options) => (await runCommand(command, args, options)) === 0;

function reportFile(name) {
  mkdirSync(reports, { recursive: true });
  const file = join(reports, `${name}.json`);
  rmSync(file, { force: true });
  return file;
}

const readReport = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null);

const format = () =>
  check('format', () => run(bin('prettier'), ['--check', '--log-level', 'warn', '.']));

// What a rule finds in a file depends on that file and the ones it imports: a kept answer holds
// while the file is the same, as a circle is found again in the file that closes it.
const lint = () =>
  check('lint', () =>
    run(bin('eslint'), [
      '--max-warnings',
      '0',
      '--cache',
      '--cache-strategy',
      'content',
      '--cache-location',
      join(data, 'eslint'),
      '.',
    ]),
  );

const types = () =>
  check('types', async () => {
    const quiet = { env: nextEnvironment, stdio: ['ignore', 'ignore', 'inherit'] };
    return (await run(bin('next'), ['typegen'], quiet)) && run(bin('tsc'), ['--noEmit']);
  });

/** Runs vitest projects and counts their tests. */
export function vitest(name, projects, env = {}) {
  const file = reportFile(name);
  const args = [
    'run',
    ...projects.flatMap((project) => ['--project', project]),
    '--passWithNoTests=false',
    '--reporter=dot',
    '--reporter=json',
    `--outputFile.json=${file}`,
  ];
  return check(
    `${name} tests`,
    () => run(bin('vitest'), args, { env: { ...process.env, ...env, CI: '1' } }),
    () => {
      const report = readReport(file);
      return report && { passed: report.numPassedTests, failed: report.numFailedTests };
    },
  );
}

/** Runs the browser tests against a served build and counts them. */
export function playwright(env) {
  const file = reportFile('browser');
  return check(
    'browser tests',
    () =>
      run(node, ['node_modules/@playwright/test/cli.js', 'test', '--reporter=list,json'], {
        env: { ...process.env, ...env, CI: '1', PLAYWRIGHT_JSON_OUTPUT_NAME: file },
      }),
    () => {
      const stats = readReport(file)?.stats;
      // One that passed at the second try has not passed.
      return stats && { passed: stats.expected, failed: stats.unexpected + stats.flaky };
    },
  );
}

/** Packages, files and exports that nothing uses. */
export const unused = () => check('unused code', () => run(bin('knip'), []));

/** Everything that needs no database: two at a time, for two cores. */
export async function verify() {
  await Promise.all([
    lint(),
    (async () => {
      await format();
      await types();
      await vitest('kernel', ['kernel']);
    })(),
  ]);
}

export function printTally() {
  console.log(`\n${tally.passed} passed, ${tally.failed} failed`);
  if (tally.failed > 0) process.exitCode = 1;
}
