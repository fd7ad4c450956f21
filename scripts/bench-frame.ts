/**
 * How long it takes from moving a gain to the painted answer, on a slow machine: drags the gain rule on a phone and holds an
 * arrow key on a wide screen, with the CPU throttled, and prints median and 95th percentile. The browser throttles the page's own
 * thread alone; the workers that the engine runs in are slowed as much by slow-worker.js, so that nothing is gained by moving work
 * there but that two threads work at once. Numbers mean something only on a machine that does nothing else; the load is printed
 * beside them.
 *   npm run bench:frame
 */
import { readFileSync } from 'node:fs';
import { loadavg } from 'node:os';
import { join } from 'node:path';
import type { CDPSession, Page } from 'playwright-core';
import { BenchPage } from '../tests/support/bench-page';
import { launchBrowser, openPage, type SizeName } from '../tests/support/browser';
import { startBuiltServer } from '../tests/support/built-server';
import { engineer } from '../tests/support/demo-people';
import { Visitor } from '../tests/support/visitor';
import { root } from './root.mjs';

/** What frame-watch.js gives the page: from input to paint in ms, by chart. */
interface FrameWatch {
  clear(): void;
  times(): Record<string, number[]>;
}

const THROTTLE = 4;
const MOVES = 60;
const WARM_UP = 15;
/** Between two moves: longer than a frame, so that each is answered by itself. */
const PAUSE_MS = 45;

const slowWorker = readFileSync(join(root, 'scripts', 'slow-worker.js'), 'utf8')
  .replace('export default', '')
  .trim()
  .replace(/;$/, '');

const pause = (page: Page) => page.waitForTimeout(PAUSE_MS);

async function dragRule(page: Page, bench: BenchPage, moves: number): Promise<void> {
  const box = await bench.rule('Kp').boundingBox();
  if (box === null) throw new Error('The gain rule is not on the screen.');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let k = 1; k <= moves; k += 1) {
    await page.mouse.move(x + 50 * Math.sin(k / 9), y);
    await pause(page);
  }
  await page.mouse.up();
}

async function pressArrows(page: Page, bench: BenchPage, moves: number): Promise<void> {
  const rule = bench.rule('Kp');
  await rule.focus();
  for (let k = 1; k <= moves; k += 1) {
    await page.keyboard.press(Math.sin(k / 9) > 0 ? 'ArrowRight' : 'ArrowLeft');
    await pause(page);
  }
}

const gestures = { phone: dragRule, wide: pressArrows };

function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)];
}

/** Milliseconds of the page's main thread so far, by kind of work; its own time, whatever else the machine does. */
async function threadTimes(session: CDPSession): Promise<Record<string, number>> {
  const { metrics } = await session.send('Performance.getMetrics');
  return Object.fromEntries(metrics.map(({ name, value }) => [name, 1000 * value]));
}

const told = (name: string, values: readonly number[]): string => {
  const [median, high] = [0.5, 0.95].map((share) => percentile(values, share).toFixed(1));
  return `${name} median ${median} ms, p95 ${high} ms (${values.length})`;
};

async function measure(page: Page, bench: BenchPage, size: SizeName): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send('Performance.enable', { timeDomain: 'threadTicks' });
  await gestures[size](page, bench, WARM_UP);
  const before = await threadTimes(session);
  await gestures[size](page, bench, WARM_UP);
  const after = await threadTimes(session);
  const share = (name: string) => ((after[name] - before[name]) / WARM_UP).toFixed(1);
  console.log(`${size}, unthrottled thread time per move: ${share('TaskDuration')} ms`);
  console.log(`  script ${share('ScriptDuration')}, style ${share('RecalcStyleDuration')}, layout ${share('LayoutDuration')}`);
  await session.send('Emulation.setCPUThrottlingRate', { rate: THROTTLE });
  for (const worker of page.workers()) await worker.evaluate(`(${slowWorker})(${THROTTLE})`);
  await page.evaluate(() => (window as unknown as { frameWatch: FrameWatch }).frameWatch.clear());
  await gestures[size](page, bench, MOVES);
  const charts = await page.evaluate(() => (window as unknown as { frameWatch: FrameWatch }).frameWatch.times());
  console.log(`${size}, CPU throttled ${THROTTLE} times, from input to paint, load ${loadavg()[0].toFixed(1)}`);
  for (const [chart, times] of Object.entries(charts)) if (times.length > 0) console.log(`  ${told(chart, times)}`);
}

const server = process.env.BENCH_URL ? null : await startBuiltServer();
const url = process.env.BENCH_URL ?? server?.url ?? '';
const browser = await launchBrowser();
for (const size of ['phone', 'wide'] as const) {
  const { page, context } = await openPage(browser, size);
  const visitor = new Visitor(page, url);
  await visitor.isSignedInAs(engineer);
  const bench = new BenchPage(visitor, size);
  await page.addInitScript({ path: join(root, 'scripts', 'frame-watch.js') });
  await bench.open(await visitor.firstProjectId());
  await page.waitForTimeout(1500);
  await measure(page, bench, size);
  await context.close();
}
await browser.close();
await server?.stop();
