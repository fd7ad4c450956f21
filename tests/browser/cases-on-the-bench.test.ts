import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CaseResult, DesignRevision, Judged, KeptAnalysis } from '@/contract';
import { BenchPage } from '../support/bench-page';
import { launchBrowser, openPage, sizes, type SizeName } from '../support/browser';
import { startBuiltServer, type BuiltServer } from '../support/built-server';
import { engineer, reviewer } from '../support/demo-people';
import { secondPerson, type SecondPerson } from '../support/second-person';
import { Visitor } from '../support/visitor';

let server: BuiltServer;
let browser: Browser;
let jonas: SecondPerson;

beforeAll(async () => {
  server = await startBuiltServer();
  browser = await launchBrowser();
  jonas = await secondPerson(server.url, reviewer);
}, 300_000);

afterAll(async () => {
  await jonas.end();
  await browser.close();
  await server.stop();
});

const ms = ({ numbers }: CaseResult) => numbers.sensitivity.ms.value.toFixed(2);

async function withTheDemo(size: SizeName) {
  const { page, context } = await openPage(browser, size);
  const visitor = new Visitor(page, server.url);
  await visitor.isSignedInAs(engineer);
  const project = await visitor.firstProjectId();
  const get = async <Answer>(path: string) =>
    (await (await page.request.get(`${server.url}/api/projects/${project}${path}`)).json()) as Answer;
  const { items } = await get<{ items: { id: string }[] }>('/analyses');
  const analysis = await get<KeptAnalysis>(`/analyses/${items[0].id}`);
  return { page, context, visitor, project, get, analysis, bench: new BenchPage(visitor, size) };
}

/** The limit that a gain reaches first when it is turned up, as its rule says it. */
function upperMark(words: string) {
  const [, value, quantity, where] = /to ([\d.]+) \(([^,]+), (.+?)\)/.exec(words) ?? [];
  return { value: Number(value), quantity, where };
}

describe.each(Object.keys(sizes) as SizeName[])('24 cases at the %s size', (size) => {
  it('say the same on the cases screen and on the bench, over all and one by one', async () => {
    const { page, context, visitor, project, analysis, bench } = await withTheDemo(size);
    expect(analysis.results).toHaveLength(24);
    const { headline } = analysis;
    const first = [`Ms\n${headline.value?.toFixed(2)}`, headline.case?.name ?? '', 'worst of 24', '7 % more gain', '16 ms more dead time'];
    await visitor.open(`/projects/${project}/cases`);
    const overview = page.getByRole('region', { name: 'Worst margin over all cases' });
    await overview.waitFor();
    const overCases = await overview.innerText();
    await bench.open(project);
    const onTheBench = await bench.strip();
    for (const words of first) {
      expect(overCases).toContain(words);
      expect(onTheBench).toContain(words);
    }
    for (const result of [analysis.results[3], analysis.results[12], analysis.results[23]]) {
      await visitor.open(`/projects/${project}/bench?case=${result.case.id}`);
      await bench.ready();
      await bench.chart(new RegExp(`Ms ${ms(result)} at`)).waitFor({ state: 'attached' });
    }
    await context.close();
  });

  it('fail at exactly the limit and in exactly the case that a gain’s mark names, once it is passed', async () => {
    const { page, context, project, get, bench } = await withTheDemo(size);
    await bench.open(project);
    await bench.choose('Kp');
    const marks = page.getByText(/^Every limit holds from .* to /).first();
    await marks.waitFor({ state: 'attached' });
    const mark = upperMark((await marks.textContent()) ?? '');
    expect(mark.quantity).toBe('Ms');

    await bench.type('Kp', String(mark.value));
    await expect.poll(() => bench.strip()).toMatch(/^tight/);
    const beyond = (mark.value * 1.02).toFixed(3);
    await bench.type('Kp', beyond);
    await expect.poll(() => bench.strip()).toMatch(/^fail/);
    expect(await bench.strip()).toContain(mark.where);

    const [design] = (await get<{ items: DesignRevision[] }>('/designs')).items;
    const { controller, sampling, actuator } = design;
    const turned = { controller: { ...controller, kp: Number(beyond) }, sampling, actuator, parts: 'all' };
    const answer = await page.request.post(`${server.url}/api/projects/${project}/judge`, {
      data: turned,
      headers: { origin: server.url },
    });
    const { results } = (await answer.json()) as Judged;
    const failing = results.flatMap((result) =>
      result.checks.filter(({ verdict }) => verdict === 'fail').map(({ quantity }) => `${quantity} in ${result.case.name}`),
    );
    expect(failing).toEqual([`ms in ${mark.where}`]);
    await context.close();
  });
});

it('a case that is chosen is drawn for a second person too, who may look and keep nothing', async () => {
  const { analysis, project, context } = await withTheDemo('wide');
  const last = analysis.results[23].case;
  const answer = await jonas.api.get(`/api/projects/${project}/analyses/${analysis.id}/cases/${last.id}`);
  expect(answer.status()).toBe(200);
  const refused = await jonas.api.delete(`/api/projects/${project}/cases/${last.id}`, { headers: { 'if-match': '"1"' } });
  expect(refused.status()).toBe(403);
  await context.close();
});
