// npm test: every check there is, one after the other, and at the end one line with the true totals.
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { ensureChromium } from './find-chromium.mjs';
import { isBuilt } from './source-stamp.mjs';

const root = fileURLToPath(new URL('../../', import.meta.url));
process.chdir(root);
const totals = { passed: 0, failed: 0 };

function count(name, ok) {
  totals[ok ? 'passed' : 'failed'] += 1;
  console.log(`${ok ? 'passed' : 'FAILED'}: ${name}`);
}

/** A check that passes or fails as a whole (lint, types, format, build). */
function whole(name, command, args) {
  console.log(`\n== ${name}`);
  count(name, spawnSync(command, args, { stdio: 'inherit' }).status === 0);
}

/** Test suites, counted test by test; a suite that cannot run at all counts as one failure. */
function suites(name, projects) {
  console.log(`\n== ${name}`);
  mkdirSync('tmp', { recursive: true });
  const report = `tmp/jest-${projects[0]}.json`;
  rmSync(report, { force: true });
  spawnSync(
    process.execPath,
    [
      '--experimental-vm-modules',
      '--no-warnings',
      'node_modules/jest/bin/jest.js',
      '--selectProjects',
      ...projects,
      '--json',
      `--outputFile=${report}`,
      '--maxWorkers=2',
      '--workerIdleMemoryLimit=1500MB',
    ],
    { stdio: ['ignore', 'ignore', 'inherit'] },
  );
  try {
    const result = JSON.parse(readFileSync(report, 'utf8'));
    totals.passed += result.numPassedTests;
    totals.failed += result.numFailedTests + result.numRuntimeErrorTestSuites;
    if (result.numTotalTests === 0) count(`${name} ran no test`, false);
  } catch {
    count(`${name} did not run`, false);
  }
}

const bin = (path) => [process.execPath, [`node_modules/${path}`]];
const node = (name, path, ...args) => whole(name, bin(path)[0], [...bin(path)[1], ...args]);

node('format', 'prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.');
node('lint', 'eslint/bin/eslint.js', '.', '--max-warnings', '0');
for (const project of ['libs/domain', 'apps/api', 'tests']) {
  node(`types of ${project}`, 'typescript/bin/tsc', '--noEmit', '-p', `${project}/tsconfig.json`);
}
node(
  'types of apps/client',
  '@angular/compiler-cli/bundles/src/bin/ngc.js',
  '--noEmit',
  '-p',
  'apps/client/tsconfig.app.json',
);
suites('unit and verification tests', ['domain', 'verification', 'client']);
suites('API tests', ['api']);
if (isBuilt(root)) count('build (as it stands)', true);
else whole('build', process.execPath, ['apps/tools/build.mjs']);
try {
  process.env.LIGAMENT_CHROMIUM = ensureChromium();
  suites('browser journeys', ['journeys']);
} catch (error) {
  console.error(error.message);
  count('browser journeys', false);
}

console.log(`\n${totals.passed} passed, ${totals.failed} failed`);
process.exitCode = totals.failed > 0 ? 1 : 0;
