// npm test: every check and test of the project, its counts added up into the last line.
//   node scripts/test.mjs [--quick]    --quick leaves out the build and the browser (npm run check)
import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './root.mjs';

const bin = (name) => join('node_modules', '.bin', name);
const scratch = mkdtempSync(join(tmpdir(), 'kerbline-test-'));
let passed = 0;
let failed = 0;

function run(command, args) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'] });
    child.on('error', () => resolve(1));
    child.on('exit', (code) => resolve(code ?? 1));
  });
}

/** A tool that says yes or no counts as one test. */
async function check(title, command, args) {
  console.log(`\n== ${title}`);
  const code = await run(command, args);
  if (code === 0) passed += 1;
  else failed += 1;
}

/** A test runner's own counts; a runner that dies without a report is one failure. */
async function tests(title, config) {
  console.log(`\n== ${title}`);
  const report = join(scratch, `${title.replace(/\W+/g, '-')}.json`);
  const code = await run(bin('vitest'), [
    'run',
    '--config',
    config,
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ]);
  try {
    const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(readFileSync(report, 'utf8'));
    passed += numPassedTests;
    failed += numFailedTests;
    if (code !== 0 && numFailedTests === 0) failed += Math.max(1, numFailedTestSuites);
  } catch {
    failed += 1;
  }
}

await check('Format', bin('prettier'), ['--check', '--log-level', 'warn', '.']);
await check('Lint', bin('eslint'), ['.', '--max-warnings', '0']);
await check('Types', bin('tsc'), ['--noEmit']);
await check('Import rules', bin('depcruise'), [
  '--config',
  '.dependency-cruiser.cjs',
  'app',
  'components',
  'hooks',
  'figures',
  'analysis',
  'contract',
  'server',
  'db',
]);
await tests('Unit, API and component tests', 'vitest.config.ts');
if (!process.argv.includes('--quick')) {
  await check('Build', process.execPath, [join('scripts', 'build.mjs')]);
  await check('First load', process.execPath, [join('scripts', 'check-bundle-size.mjs')]);
  await tests('Browser tests', 'vitest.browser.config.ts');
}
rmSync(scratch, { recursive: true, force: true });
console.log(`\n${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
