import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { PlantRevision, Project } from '@/contract';
import { BenchPage } from '../support/bench-page';
import { axeFindings, launchBrowser, openPage, sizes, type SizeName } from '../support/browser';
import { startBuiltServer, type BuiltServer } from '../support/built-server';
import { engineer } from '../support/demo-people';
import { Visitor } from '../support/visitor';

let server: BuiltServer;
let browser: Browser;

beforeAll(async () => {
  server = await startBuiltServer();
  browser = await launchBrowser();
}, 300_000);

afterAll(async () => {
  await browser.close();
  await server.stop();
});

const car = {
  name: 'Car',
  plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
  deadTimeBasis: 'measured',
};
const design = {
  name: 'Hold',
  controller: { form: 'parallel', kp: 1.05, ki: 0.42, kd: 0.3, derivativeFilterTime: 0.035 },
  sampling: 'continuous',
};

async function aProject(visitor: Visitor, size: SizeName) {
  const post = async <Body>(path: string, data: object): Promise<Body> => {
    const answer = await visitor.page.request.post(`${server.url}/api${path}`, { data, headers: { origin: server.url } });
    if (!answer.ok()) throw new Error(await answer.text());
    return answer.json() as Promise<Body>;
  };
  const { id } = await post<Project>('/projects', { name: `Notations, ${size}` });
  await post(`/projects/${id}/plants`, car);
  await post(`/projects/${id}/designs`, design);
  const latest = async (): Promise<PlantRevision> => {
    const answer = await visitor.page.request.get(`${server.url}/api/projects/${id}/plants`);
    return ((await answer.json()) as { items: PlantRevision[] }).items[0];
  };
  return { id, latest };
}

describe.each(Object.keys(sizes) as SizeName[])('a plant in three notations at the %s size', (size) => {
  const open = async () => {
    const { page, context } = await openPage(browser, size);
    const visitor = new Visitor(page, server.url);
    await visitor.isSignedInAs(engineer);
    const project = await aProject(visitor, size);
    const plant = async () => {
      await visitor.open(`/projects/${project.id}/plant`);
      await visitor.sees('Revisions');
    };
    const write = (notation: string) => page.getByRole('radio', { name: notation, exact: true }).click();
    const typed = (field: string) => page.getByLabel(field, { exact: true }).inputValue();
    return { page, context, visitor, project, plant, write, typed };
  };

  it('shows the same numbers and curves on the bench', async () => {
    const { context, visitor, project, plant, write } = await open();
    const bench = new BenchPage(visitor, size);
    const seen = async () => {
      await bench.open(project.id);
      await expect.poll(() => bench.strip()).toMatch(/\d/);
      return { strip: await bench.strip(), charts: await bench.descriptions() };
    };
    const asPolynomials = await seen();
    for (const [revision, notation, kind] of [
      [2, 'Poles and zeros', 'roots'],
      [3, 'Formula', 'formula'],
    ] as const) {
      await plant();
      await write(notation);
      await visitor.press(`Keep as plant rev ${revision}`);
      await expect.poll(() => project.latest()).toMatchObject({ revision, plant: { kind } });
      expect(await seen()).toEqual(asPolynomials);
    }
    await context.close();
  });

  it('keeps what was typed in each, over a change of notation and a reload', async () => {
    const { page, context, visitor, plant, write, typed } = await open();
    await plant();
    await write('Formula');
    await visitor.fill('Formula in s', 'k exp(-0.08 s)/(s (T s + 1))');
    await visitor.fill('k', '2.1');
    await visitor.fill('T', '0.35');
    await page.getByRole('img', { name: /^P of s is 6, over s times open bracket s plus 2\.85714 close bracket, times e/ }).waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await write('Poles and zeros');
    await expect.poll(() => typed('Poles')).toBe('0, -2.85714285714286');
    await visitor.fill('Poles', '0, -3 ± ');
    await page.reload();
    await visitor.sees('Revisions');
    expect(await typed('Poles')).toBe('0, -3 ± ');
    await write('Formula');
    expect(await typed('Formula in s')).toBe('k exp(-0.08 s)/(s (T s + 1))');
    expect(await typed('T')).toBe('0.35');
    await context.close();
  });

  it('says where a formula is wrong, and leaves it as it was typed', async () => {
    const { page, context, visitor, plant, write, typed } = await open();
    const wrong = '2.1 exp(-0.08 s)/(s (0.35 s + 1)';
    await plant();
    await write('Formula');
    await visitor.fill('Formula in s', wrong);
    await visitor.sees('A bracket is open at character 18. Close it, or take it out.');
    await visitor.press('Keep as plant rev 2');
    await visitor.sees('A bracket is open at character 18. Close it, or take it out.');
    await page.reload();
    await visitor.sees('A bracket is open at character 18. Close it, or take it out.');
    expect(await typed('Formula in s')).toBe(wrong);
    await visitor.fill('Formula in s', `${wrong})`);
    await page.getByText('A bracket is open').waitFor({ state: 'detached' });
    await context.close();
  });

  it('names a root that stands alone', async () => {
    const { context, visitor, plant, write } = await open();
    await plant();
    await write('Poles and zeros');
    await visitor.fill('Poles', '-0.5 + 3i');
    await visitor.sees('−0.5 + 3i stands alone. Write the pair as −0.5 ± 3i, or add −0.5 − 3i.');
    await context.close();
  });

  it('says that a formula needs signal, and reads it when there is some', async () => {
    const { page, context, visitor, plant, write } = await open();
    await plant();
    await write('Formula');
    await context.setOffline(true);
    await visitor.fill('Formula in s', '3 exp(-0.1 s)/(s + 4)');
    await visitor.sees('A formula is read by the server.');
    await context.setOffline(false);
    await page.getByRole('img', { name: /^P of s is 3, over s plus 4/ }).waitFor();
    await context.close();
  });
});
