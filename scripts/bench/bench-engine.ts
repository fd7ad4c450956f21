/** The engine against the least work that its answers need, on one core: see bench.mjs. */
import { readFileSync } from 'node:fs';
import { analyseLoop, buildLoop } from '@/analysis';
import { Loop, type Analysis, type LoopInput } from '@/contract';
import { frequencyBaseline } from './frequency-baseline';
import { marginsAlone } from './margins-alone';
import { median, quantile } from './quantile';
import { timeBaseline } from './time-baseline';

const WARM_UP = 30;
const PAIRS = 25;
/** Runs of one thing timed together, so that the clock's grain does not show. */
const BATCH = 4;

const { loops } = JSON.parse(readFileSync('tests/fixtures/bench_loops.json', 'utf8')) as { loops: LoopInput[] };

/** ms of one run, by a batch of them. */
function timed(run: () => unknown): number {
  const start = performance.now();
  for (let k = 0; k < BATCH; k += 1) run();
  return (performance.now() - start) / BATCH;
}

function seriesOf({ timeResponse }: Analysis) {
  return [timeResponse?.reference, timeResponse?.load].flatMap((series) => (series ? [series] : []));
}

/** Everything about one loop; baseline and analysis alternate, so that a busy machine slows both alike. */
function measure(input: LoopInput) {
  const loop = Loop.parse(input);
  const answer = analyseLoop(loop);
  const model = buildLoop(loop);
  const curves = frequencyBaseline(model, answer.frequencyResponse?.frequencies ?? []);
  const steps = timeBaseline(model, seriesOf(answer));
  const runs = {
    baseline: () => curves() + steps(),
    full: () => analyseLoop(loop),
    frequencies: () => analyseLoop(loop, { responses: false }),
    margins: () => marginsAlone(loop),
  };
  const times: Record<keyof typeof runs, number[]> = { baseline: [], full: [], frequencies: [], margins: [] };
  const names = Object.keys(runs) as (keyof typeof runs)[];
  for (let k = 0; k < WARM_UP; k += 1) for (const name of names) runs[name]();
  for (let k = 0; k < PAIRS; k += 1) for (const name of names) times[name].push(timed(runs[name]));
  return Object.fromEntries(names.map((name) => [name, median(times[name])])) as Record<keyof typeof runs, number>;
}

const measured = loops.map(measure);
const ratios = measured.map(({ full, baseline }) => full / baseline);
const of = (name: keyof (typeof measured)[number]) => median(measured.map((times) => times[name]));
console.log(
  JSON.stringify({
    loops: loops.length,
    baselineMs: of('baseline'),
    fullMs: of('full'),
    frequencyMs: of('frequencies'),
    marginsMs: of('margins'),
    ratio: median(ratios),
    ratioNinth: quantile(ratios, 0.9),
    ratioWorst: Math.max(...ratios),
  }),
);
