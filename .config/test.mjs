/* Everything that can be checked, in the order in which it is quickest to learn that something is wrong. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild, ensureChromium, ensurePackages, root } from './ensure.mjs';

const long = process.argv.includes('--long');
ensurePackages();
ensureChromium();
ensureBuild();

const bin = (name) => join(root, 'node_modules', '.bin', name);
const results = join(root, '.cache', 'results');
rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });
const env = { ...process.env, EARTHSTRAP_LONG: long ? '1' : '', FORCE_COLOR: '0', NODE_NO_WARNINGS: '1' };
let passed = 0;
let failed = 0;

/** Runs one step that is right or wrong as a whole. */
function step(name, command, args) {
  const started = Date.now();
  const ok = spawnSync(command, args, { cwd: root, stdio: 'inherit', env }).status === 0;
  console.log(`${ok ? 'ok    ' : 'FAILED'} ${name} (${Math.round((Date.now() - started) / 1000)} s)`);
  if (ok) passed += 1;
  else failed += 1;
}

/** Runs a test runner that writes its count as JSON; a runner that ends without a count has failed. */
function runner(name, command, args, countOf, file) {
  const started = Date.now();
  const status = spawnSync(command, args, { cwd: root, stdio: 'inherit', env }).status;
  const count = existsSync(file) ? countOf(JSON.parse(readFileSync(file, 'utf8'))) : { passed: 0, failed: 0 };
  passed += count.passed;
  failed += count.failed + (status !== 0 && count.failed === 0 ? 1 : 0) + (count.passed + count.failed === 0 && status === 0 ? 1 : 0);
  console.log(`${name}: ${count.passed} passed, ${count.failed} failed (${Math.round((Date.now() - started) / 1000)} s)`);
}

step('types', bin('tsc'), ['-b', 'shared', 'server', 'src', 'tests']);
step('lint', bin('eslint'), ['-c', '.config/eslint.config.js', '--max-warnings', '0', '.']);
step('import rules', bin('depcruise'), ['--config', '.config/dependency-cruiser.cjs', 'shared', 'server', 'src', 'tests']);
step('nothing unused', bin('knip'), ['-c', '.config/knip.json']);

const unitFile = join(results, 'vitest.json');
runner(
  'unit, service, API and contract tests',
  bin('vitest'),
  ['run', '--reporter=dot', '--reporter=json', `--outputFile.json=${unitFile}`],
  (report) => ({ passed: report.numPassedTests, failed: report.numFailedTests }),
  unitFile,
);

const browserFile = join(results, 'playwright.json');
env.PLAYWRIGHT_JSON_OUTPUT_NAME = browserFile;
runner(
  'browser tests',
  bin('playwright'),
  ['test', '-c', '.config/playwright.config.ts', '--reporter=line,json'],
  (report) => ({ passed: report.stats.expected + report.stats.flaky, failed: report.stats.unexpected }),
  browserFile,
);

console.log(`${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
