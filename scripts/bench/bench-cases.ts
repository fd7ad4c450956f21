/** Judging many cases through the server: see bench-cases.mjs. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { cpus, loadavg } from 'node:os';
import { join } from 'node:path';
import { analyseLoop } from '@/analysis';
import { caseLoop } from '@/analysis/project';
import { CreateDesign, type Conditions } from '@/contract';
import { createApp } from '@/server/app';
import { readConfig } from '@/server/config';
import { createContext } from '@/server/context';
import { createLoopPool } from '@/server/jobs/loop-pool';
import { median } from './quantile';

const scratch = process.argv[2];
const ROUNDS = 9;
/** Until every thread has compiled what it runs. */
const WARM_UP = 20;
const SIDE = 20;
const goals = { overhead: 1.2, speedUp: 1.7 };

const plant = { kind: 'coefficients', numerator: [2.1], denominator: [0.0007, 0.037, 0.4, 1, 0], deadTime: 0.08 };
const design = CreateDesign.parse({
  name: 'Speed hold',
  controller: { form: 'parallel', kp: 0.6, ki: 0.1, kd: 0.1, derivativeFilterTime: 0.04 },
  sampling: 'continuous',
});
const limits = [
  { quantity: 'ms', bound: 'max', limit: 1.7 },
  { quantity: 'phaseMargin', bound: 'min', limit: 45 },
  { quantity: 'gainMargin', bound: 'min', limit: 2 },
  { quantity: 'delayMargin', bound: 'min', limit: 0.1 },
];
const along = (axis: string, parameters: (k: number) => object) => ({
  axis,
  points: Array.from({ length: SIDE }, (_, k) => ({ at: k + 1, parameters: parameters(k) })),
});
const lists = [along('speed', (k) => ({ deadTime: 0.05 + 0.005 * k })), along('mass', (k) => ({ gainFactor: 0.8 + 0.02 * k }))];

/** The server with so many threads, and what judges every case of a project made in it. */
async function serverWith(threads: number) {
  const config = readConfig({ DATA_DIR: join(scratch, `data-${threads}`), LOG_LEVEL: 'silent', ANALYSE_PER_MINUTE: '100000' });
  const context = createContext(config, {
    jobs: createLoopPool({ threads, entry: { filename: join(scratch, 'worker.mjs'), execArgv: [] } }),
  });
  const server = createServer(createApp(context));
  // The connection waits while the others are measured.
  server.keepAliveTimeout = 600_000;
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  let cookie = '';
  async function call<Body>(method: string, path: string, body?: unknown): Promise<Body> {
    // Packing is for a network that is slower than a processor, which there is none of here.
    const headers = { origin: url, cookie, 'content-type': 'application/json', 'if-match': '*', 'accept-encoding': 'identity' };
    const response = await fetch(`${url}${path}`, { method, headers, body: body === undefined ? undefined : JSON.stringify(body) });
    if (!response.ok) throw new Error(`${method} ${path} answered ${response.status}: ${await response.text()}`);
    cookie ||= response.headers.getSetCookie().join('; ').split(';')[0];
    return (await response.json()) as Body;
  }
  await call('POST', '/api/auth/sign-up/email', { name: 'Bench', email: 'bench@team.example', password: 'long enough for a bench' });
  const project = await call<{ id: string }>('POST', '/api/projects', { name: 'Bench' });
  const at = `/api/projects/${project.id}`;
  const { id: plantId } = await call<{ id: string }>('POST', `${at}/plants`, { name: 'Plant', plant, deadTimeBasis: 'measured' });
  await call('POST', `${at}/cases/grid`, { plantId, lists, replace: true });
  await call('PUT', `${at}/limits`, { items: limits });
  const { name: _name, note: _note, ...content } = design;
  return {
    conditions: await call<Conditions>('GET', `${at}/conditions`),
    judge: () => call<unknown>('POST', `${at}/judge`, content),
    close: async () => {
      server.closeAllConnections();
      server.close();
      await context.close();
    },
  };
}

async function clock(work: () => unknown): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

const [one, two] = [await serverWith(1), await serverWith(2)];
const loops = one.conditions.cases.map((frozen) => caseLoop(frozen, CreateDesign.parse(design)));
const inTurn = () => loops.forEach((loop) => analyseLoop(loop, { curves: false, responses: false }));
const times = { inTurn: [] as number[], one: [] as number[], two: [] as number[] };
// One after the other in every round, so that whatever else slows the machine slows all three.
for (let round = 0; round < WARM_UP + ROUNDS; round += 1) {
  const measured = { inTurn: await clock(inTurn), one: await clock(one.judge), two: await clock(two.judge) };
  if (round < WARM_UP) continue;
  for (const name of ['inTurn', 'one', 'two'] as const) times[name].push(measured[name]);
}
await Promise.all([one.close(), two.close()]);

const said = (value: number, goal: string, met: boolean) => `${value.toFixed(2)} (goal ${goal}: ${met ? 'met' : 'not met'})`;
const ms = (value: number) => `${value.toFixed(0)} ms`;
const together = { inTurn: median(times.inTurn), one: median(times.one), two: median(times.two) };
const overhead = median(times.one.map((time, k) => time / times.inTurn[k]));
const speedUp = median(times.one.map((time, k) => time / times.two[k]));
console.log(
  `\n${loops.length} cases of order 4 with dead time, medians on the clock; ${cpus().length} cores, load ${loadavg()[0].toFixed(1)}`,
);
console.log(`margins alone, one after the other         ${ms(together.inTurn)}`);
console.log(`judged by the server on one thread         ${ms(together.one)}`);
console.log(`judged by the server on two threads        ${ms(together.two)}`);
console.log(`server / margins alone                     ${said(overhead, `at most ${goals.overhead}`, overhead <= goals.overhead)}`);
console.log(`two threads, times faster than one         ${said(speedUp, `at least ${goals.speedUp}`, speedUp >= goals.speedUp)}`);
