// npm run bench: how the engine compares with the least work that its answers need, and with SciPy where that is installed.
// The engine is bundled first, as the server runs it. Ratios are what counts: times depend on the machine and what else it does.
import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { cpus, loadavg, tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'esbuild';
import { root } from '../root.mjs';

/** Debian's own Python, where python3-scipy puts its packages. */
const PYTHON = '/usr/bin/python3';
const ROUNDS = 1;
const goals = { ratio: 4, withStep: 20, withoutStep: 10 };

const here = join(root, 'scripts', 'bench');
const fixture = join(root, 'tests', 'fixtures', 'bench_loops.json');

function runEngine(entry) {
  return JSON.parse(execFileSync(process.execPath, [entry], { cwd: root, encoding: 'utf8' }));
}

function runScipy() {
  const { status, stdout } = spawnSync(PYTHON, [join(here, 'bench_scipy.py'), fixture], { encoding: 'utf8' });
  return status === 0 ? JSON.parse(stdout) : null;
}

const middle = (numbers) => [...numbers].sort((a, b) => a - b)[numbers.length >> 1];
const ms = (value) => `${value.toFixed(3)} ms`;
const against = (value, goal, met) => `${value.toFixed(1)} (goal ${goal}: ${met ? 'met' : 'not met'})`;

function report({ loops, processor, clock, ratio, ratioNinth, ratioWorst }, scipy) {
  console.log(`\n${loops} loops, medians of processor time; ${cpus().length} cores, load ${loadavg()[0].toFixed(1)}`);
  console.log(`least work: the returned grid and steps    ${ms(processor.baseline)}`);
  console.log(`full analysis                              ${ms(processor.full)}`);
  console.log(`without time responses                     ${ms(processor.frequencies)}`);
  console.log(`margins and stability alone                ${ms(processor.margins)}, ${Math.round(1000 / processor.margins)} a second`);
  console.log(`full analysis / least work                 ${against(ratio, `at most ${goals.ratio}`, ratio <= goals.ratio)}`);
  console.log(`  nine in ten below ${ratioNinth.toFixed(1)}, worst ${ratioWorst.toFixed(1)}`);
  if (!scipy) return console.log('SciPy is not installed (python3-scipy): not compared.');
  const withStep = scipy.medianMsPerLoop / clock.full;
  const withoutStep = scipy.medianMsWithoutStep / clock.frequencies;
  console.log(`on the clock, with and without responses   ${ms(clock.full)}, ${ms(clock.frequencies)}`);
  console.log(`SciPy on the clock                         ${ms(scipy.medianMsPerLoop)}, ${ms(scipy.medianMsWithoutStep)}`);
  console.log(`times faster, with the step response       ${against(withStep, goals.withStep, withStep >= goals.withStep)}`);
  console.log(`times faster, without                      ${against(withoutStep, goals.withoutStep, withoutStep >= goals.withoutStep)}`);
}

const scratch = mkdtempSync(join(tmpdir(), 'kerbline-bench-'));
try {
  const entry = join(scratch, 'bench-engine.mjs');
  await build({
    entryPoints: [join(here, 'bench-engine.ts')],
    outfile: entry,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    alias: { '@': root },
  });
  const rounds = Array.from({ length: ROUNDS }, () => ({ engine: runEngine(entry), scipy: runScipy() }));
  for (const { engine, scipy } of rounds) report(engine, scipy);
  console.log(`\nratio over ${ROUNDS} rounds: ${middle(rounds.map(({ engine }) => engine.ratio)).toFixed(1)}`);
} finally {
  rmSync(scratch, { recursive: true, force: true });
}
