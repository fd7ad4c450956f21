import type { APIRequestContext, Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Case, KeptAnalysis, JobAnswer, Job, PlantRevision, Project } from '@/contract';
import { aDesign, aPlant } from '../support/a-project';
import { axeFindings, launchBrowser, openPage, sizes, type SizeName } from '../support/browser';
import { startBuiltServer, type BuiltServer } from '../support/built-server';
import { crew, engineer } from '../support/demo-people';
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

/** The API as the person at this browser may call it. */
function api(request: APIRequestContext) {
  return async <Body>(method: string, path: string, data?: unknown, ifMatch?: string): Promise<Body> => {
    const headers = { origin: server.url, ...(ifMatch && { 'if-match': ifMatch }) };
    const answer = await request.fetch(`${server.url}/api${path}`, { method, data, headers });
    if (!answer.ok()) throw new Error(`${method} ${path} answered ${answer.status()}: ${await answer.text()}`);
    return (await answer.json()) as Body;
  };
}

/** Says where a step got stuck, before the whole test runs out of time. */
const PATIENCE_MS = 20_000;

const speeds = [30, 40, 80, 120, 160, 240];
const masses = [1380, 1440, 1500, 1640];

/** A project with 24 cases, limits on Ms and settling, and one kept analysis of them. */
async function with24Cases(page: Page): Promise<{ id: string; analysis: KeptAnalysis }> {
  const call = api(page.request);
  const { id } = await call<Project>('POST', '/projects', { name: 'Two dozen conditions', vehicle: 'Heron 14' });
  const at = `/projects/${id}`;
  const plant = await call<PlantRevision>('POST', `${at}/plants`, {
    ...aPlant,
    plant: { ...aPlant.plant, denominator: [0.35, 1.0067, 0.0192] },
  });
  const design = await call<{ id: string }>('POST', `${at}/designs`, aDesign);
  const lists = [
    {
      axis: 'speed',
      points: speeds.map((speed) => ({ at: speed / 3.6, parameters: { deadTime: 0.05 + 3.6 / speed }, name: `${speed} km/h` })),
    },
    {
      axis: 'mass',
      points: masses.map((mass) => ({
        at: mass,
        parameters: { gainFactor: 1500 / mass },
        basis: mass === 1500 ? 'measured' : 'extrapolated',
      })),
    },
  ];
  await call('POST', `${at}/cases/grid`, { plantId: plant.id, lists, replace: true });
  const limits = await page.request.get(`${server.url}/api${at}/limits`);
  const items = [
    { quantity: 'ms', bound: 'max', limit: 2.2, target: 2.1, source: 'team rule' },
    { quantity: 'settlingTime', bound: 'max', limit: 20, target: null, source: 'driver' },
  ];
  await call('PUT', `${at}/limits`, { items }, limits.headers().etag);
  return { id, analysis: await settled(call, at, await call('POST', `${at}/analyses`, { designId: design.id })) };
}

/** The analysis itself, where it took long enough to become a job. */
async function settled(call: ReturnType<typeof api>, at: string, begun: KeptAnalysis | JobAnswer): Promise<KeptAnalysis> {
  if (!('job' in begun)) return begun;
  for (;;) {
    const job = await call<Job>('GET', `/jobs/${begun.job.id}`);
    if (job.result) return call<KeptAnalysis>('GET', `${at}/analyses/${job.result.analysisId}`);
    if (job.state !== 'running') throw new Error(`The analysis ${job.state}: ${job.problem?.detail}`);
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
}

const cell = (page: Page, name: string) => page.getByRole('gridcell', { name: new RegExp(`^${name}, `) });
const panel = (page: Page, name: string) => page.getByRole('region', { name: `Case ${name}` });
const firstCases = async (page: Page, id: string) =>
  (await api(page.request)<{ items: Case[] }>('GET', `/projects/${id}/cases?limit=200`)).items;

describe.each(Object.keys(sizes) as SizeName[])('the cases screen at the %s size', (size) => {
  const open = async (query = '') => {
    const { page, context, complaints } = await openPage(browser, size);
    page.setDefaultTimeout(PATIENCE_MS);
    const visitor = new Visitor(page, server.url);
    await visitor.isSignedInAs(engineer);
    await page.request.patch(`${server.url}/api/me`, { data: { preferences: { speedUnit: 'km/h' } }, headers: { origin: server.url } });
    project ??= await with24Cases(page);
    await visitor.open(`/projects/${project.id}/cases${query}`);
    return { page, visitor, complaints, close: () => context.close(), ...project };
  };
  let project: Awaited<ReturnType<typeof with24Cases>> | undefined;

  it('agrees with the analysis in headline, cells and panel, and is walked by keys', async () => {
    const { page, complaints, analysis, close } = await open();
    const worst = analysis.headline.case?.name ?? '';
    const ms = analysis.headline.value?.toFixed(2) ?? '';
    const strip = page.getByRole('region', { name: 'Worst margin over all cases' });
    await strip.waitFor();
    expect(await strip.innerText()).toContain(ms);
    expect(await strip.innerText()).toContain('worst of 24');
    expect(await page.getByRole('gridcell', { name: /nearest the edge of all/ }).getAttribute('aria-label')).toContain(
      `${worst}, Ms ${ms}, `,
    );
    expect(await panel(page, worst).innerText()).toContain(ms);
    expect(await page.getByRole('gridcell').count()).toBe(24);

    // Speeds run across on a wide screen and down on a phone.
    await cell(page, '30 km/h, 1,380 kg').focus();
    await page.keyboard.press(size === 'wide' ? 'ArrowRight' : 'ArrowDown');
    await page.keyboard.press('Enter');
    await panel(page, '40 km/h, 1,380 kg').waitFor();
    expect(new URL(page.url()).searchParams.get('case')).not.toBeNull();
    const shown = analysis.results.find((result) => result.case.name === '40 km/h, 1,380 kg');
    expect(await panel(page, '40 km/h, 1,380 kg').innerText()).toContain(shown?.numbers.sensitivity.ms.value.toFixed(2));
    expect(complaints).toEqual([]);
    await close();
  });

  it('shows one number over speed with its limit, and a list that sorts from the edge inwards', async () => {
    const { page, visitor, analysis, close } = await open();
    const worst = analysis.headline.case?.name ?? '';
    if (size === 'phone') await page.getByRole('radio', { name: 'Chart' }).click();
    const chart = page.getByRole('img', { name: /^Ms over speed/ });
    await chart.waitFor();
    expect(await chart.getAttribute('aria-label')).toContain(
      `at most 2.20. Nearest the edge: ${worst}, ${analysis.headline.value?.toFixed(2)}.`,
    );
    await page.getByRole('radio', { name: 'List' }).click();
    if (size === 'wide') await visitor.press('Sort by Ms');
    else {
      await visitor.press(/^Order/);
      await page.getByRole('menuitem', { name: /by Ms/ }).click();
    }
    const rows = page
      .getByRole(size === 'wide' ? 'table' : 'list', { name: 'Cases' })
      .getByRole(size === 'wide' ? 'rowheader' : 'listitem');
    expect(await rows.first().innerText()).toContain(worst);
    expect(await axeFindings(page)).toEqual([]);
    await close();
  });

  it('refuses a grid of 10,000 cases at its field and keeps what was typed, also over a reload', async () => {
    const { page, visitor, id, close } = await open('?edit=grid');
    const many = Array.from({ length: 100 }, (_, i) => i + 1).join(' ');
    await visitor.fill('Speeds to check', many);
    await visitor.fill('Masses to check', many);
    await visitor.sees('100 × 100 = 10,000 cases, at most 400');
    await visitor.sees('This grid has 10,000 cases; at most 400 are allowed.');
    await visitor.press('Make the cases');
    await page.reload();
    await page.getByRole('region', { name: 'A grid of cases' }).waitFor();
    expect(await page.getByLabel('Masses to check', { exact: true }).inputValue()).toBe(many);
    expect(await firstCases(page, id)).toHaveLength(24);
    await visitor.fill('Speeds to check', '300, 330');
    await visitor.fill('Masses to check', '1400; 1500; 1600');
    expect(await axeFindings(page)).toEqual([]);
    await visitor.press('Make 6 cases');
    await cell(page, '330 km/h, 1,600 kg').waitFor();
    expect(await firstCases(page, id)).toHaveLength(30);
    await visitor.sees('Cases changed since rev 1 was analysed.');
    await close();
  });

  it('keeps a new case as a draft over a reload, analyses it when asked to, and takes its place at the edge as declared', async () => {
    const { page, visitor, id, close } = await open('?edit=new');
    await visitor.fill('Name', 'tunnel');
    await visitor.fill('Speed', '-3');
    await visitor.sees('A speed is 0 or more.');
    await visitor.fill('Speed', '20');
    await visitor.fill('Dead time', '0.23');
    await page.reload();
    await page.getByRole('region', { name: 'A new case' }).waitFor();
    expect(await page.getByLabel('Speed', { exact: true }).inputValue()).toBe('20');
    expect(await axeFindings(page)).toEqual([]);
    await visitor.press('Add the case');
    await panel(page, 'tunnel').getByText('Not analysed yet.').waitFor();
    await visitor.press('Analyse rev 1 again');
    await page.getByText(`worst of ${(await firstCases(page, id)).length}`).waitFor({ timeout: 60_000 });
    expect(await page.getByText(/changed since rev/).count()).toBe(0);
    await panel(page, 'tunnel').getByRole('button', { name: 'Declare the slowest case' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Declare it' }).click();
    await visitor.sees(/Declared: the loop lets go below 20 km\/h/);
    await close();
  });

  it('shows both versions where someone else changed the case meanwhile, and loses neither', async () => {
    const { page, visitor, id, close } = await open();
    const call = api(page.request);
    const [{ plantId }] = await firstCases(page, id);
    const made = await call<Case>('POST', `/projects/${id}/cases`, { name: `shade ${size}`, plantId, parameters: { deadTime: 0.1 } });
    await visitor.open(`/projects/${id}/cases?edit=${made.id}`);
    await visitor.fill('Dead time', '0.12');
    await call('PATCH', `/projects/${id}/cases/${made.id}`, { parameters: { deadTime: 0.11 } }, made.etag);
    await visitor.press('Keep the case');
    const both = page.getByRole('table', { name: 'Both versions' });
    await both.waitFor();
    expect(await both.innerText()).toMatch(/0\.12 s\s+0\.11 s/);
    expect(await page.getByLabel('Dead time', { exact: true }).inputValue()).toBe('0.12');
    await visitor.press('Put mine over theirs');
    await visitor.press('Keep the case');
    await panel(page, made.name).waitFor();
    expect((await firstCases(page, id)).find((one) => one.id === made.id)?.parameters).toEqual({ deadTime: 0.12 });
    await close();
  });

  it('lets a viewer read and change nothing, and nobody change an archived project', async () => {
    const { page, context } = await openPage(browser, size);
    const visitor = new Visitor(page, server.url);
    await visitor.isSignedInAs(crew);
    await visitor.open(`/projects/${await visitor.firstProjectId()}/cases`);
    await visitor.sees('Open on bench');
    for (const name of ['Add a case', 'Make a grid', 'Change this case']) expect(await page.getByRole('button', { name }).count()).toBe(0);

    await visitor.isSignedInAs(engineer);
    const call = api(page.request);
    const away = await call<Project>('POST', '/projects', { name: 'Put away' });
    await call('POST', `/projects/${away.id}/plants`, aPlant);
    const seen = await page.request.get(`${server.url}/api/projects/${away.id}`);
    await call('PATCH', `/projects/${away.id}`, { archived: true }, seen.headers().etag);
    await visitor.open(`/projects/${away.id}/cases`);
    await visitor.sees('Nothing analysed yet');
    expect(await page.getByRole('button', { name: 'Add a case' }).count()).toBe(0);
    await context.close();
  });
});
