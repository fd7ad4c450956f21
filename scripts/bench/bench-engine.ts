/** The engine against the least work that its answers need, on one core: see bench.mjs. */
import { readFileSync } from 'node:fs';
import { analyseLoop, buildLoop } from '@/analysis';
import { Loop, type Analysis, type LoopInput } from '@/contract';
import { frequencyBaseline } from './frequency-baseline';
import { median, quantile } from './quantile';
import { timeBaseline } from './time-baseline';

const WARM_UP = 20;
const ROUNDS = 7;
/** Runs of one thing whose processor time is taken together. */
const BATCH = 4;

type Runs = Record<'baseline' | 'full' | 'frequencies' | 'margins', () => unknown>;
type Name = keyof Runs;

interface Times {
  /** Processor time of one run, ms: what other programs do on the machine does not count. */
  readonly processor: Record<Name, number>;
  /** Time on the clock of one run, ms: what SciPy's script measures too. */
  readonly clock: Record<Name, number>;
}

const { loops } = JSON.parse(readFileSync('tests/fixtures/bench_loops.json', 'utf8')) as { loops: LoopInput[] };

function seriesOf({ timeResponse }: Analysis) {
  return [timeResponse?.reference, timeResponse?.load].flatMap((series) => (series ? [series] : []));
}

function runsOf(input: LoopInput): Runs {
  const loop = Loop.parse(input);
  const answer = analyseLoop(loop);
  const model = buildLoop(loop);
  const curves = frequencyBaseline(model, answer.frequencyResponse?.frequencies ?? []);
  const steps = timeBaseline(model, seriesOf(answer));
  return {
    baseline: () => curves() + steps(),
    full: () => analyseLoop(loop),
    frequencies: () => analyseLoop(loop, { responses: false }),
    margins: () => analyseLoop(loop, { curves: false, responses: false }),
  };
}

/** Baseline and analysis alternate, so that whatever slows the machine slows both alike. */
function measure(input: LoopInput): Times {
  const runs = runsOf(input);
  const names = Object.keys(runs) as Name[];
  const byName = () => Object.fromEntries(names.map((name) => [name, [] as number[]])) as Record<Name, number[]>;
  const [processor, clock] = [byName(), byName()];
  for (let k = 0; k < WARM_UP; k += 1) for (const name of names) runs[name]();
  for (let k = 0; k < ROUNDS; k += 1) {
    for (const name of names) {
      const before = process.cpuUsage();
      for (let run = 0; run < BATCH; run += 1) {
        const start = performance.now();
        runs[name]();
        clock[name].push(performance.now() - start);
      }
      const { user, system } = process.cpuUsage(before);
      processor[name].push((user + system) / 1000 / BATCH);
    }
  }
  const medians = (times: Record<Name, number[]>) =>
    Object.fromEntries(names.map((name) => [name, median(times[name])])) as Record<Name, number>;
  return { processor: medians(processor), clock: medians(clock) };
}

const measured = loops.map(measure);
const ratios = measured.map(({ processor }) => processor.full / processor.baseline);
const overLoops = (kind: keyof Times) => {
  const of = (name: Name) => median(measured.map((times) => times[kind][name]));
  return { baseline: of('baseline'), full: of('full'), frequencies: of('frequencies'), margins: of('margins') };
};
console.log(
  JSON.stringify({
    loops: loops.length,
    processor: overLoops('processor'),
    clock: overLoops('clock'),
    ratio: median(ratios),
    ratioNinth: quantile(ratios, 0.9),
    ratioWorst: Math.max(...ratios),
  }),
);
