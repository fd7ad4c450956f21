import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Limit } from '@/contract';
import { axeFindings, launchBrowser, openPage, type SizeName } from '../support/browser';
import { startBuiltServer, type BuiltServer } from '../support/built-server';
import { crew, engineer, reviewer } from '../support/demo-people';
import { giveRole, secondPerson, type SecondPerson } from '../support/second-person';
import { Visitor } from '../support/visitor';

let server: BuiltServer;
let browser: Browser;
let jonas: SecondPerson;
let projects: string[];

beforeAll(async () => {
  server = await startBuiltServer();
  browser = await launchBrowser();
  const mira = await secondPerson(server.url, engineer);
  const { items } = (await (await mira.api.get('/api/projects')).json()) as { items: { id: string }[] };
  projects = items.map(({ id }) => id);
  for (const project of projects) await giveRole(mira.api, server.url, { project, email: reviewer.email, role: 'editor' });
  await mira.end();
  jonas = await secondPerson(server.url, reviewer);
}, 300_000);

afterAll(async () => {
  await jonas.end();
  await browser.close();
  await server.stop();
});

/** Each size works in a project of its own, so that one does not find what the other kept. */
const projectOf: Readonly<Record<SizeName, number>> = { phone: 0, wide: 1 };

async function openLimits(size: SizeName, person = engineer) {
  const { page, context, complaints } = await openPage(browser, size);
  const visitor = new Visitor(page, server.url);
  await visitor.isSignedInAs(person);
  const id = projects[projectOf[size]];
  await visitor.open(`/projects/${id}/limits`);
  await visitor.sees('A target is easier to live with.');
  return { page, context, complaints, visitor, id };
}

async function jonasKeeps(id: string, change: (limits: Limit[]) => Limit[]) {
  const path = `/api/projects/${id}/limits`;
  const read = await jonas.api.get(path);
  const { items } = (await read.json()) as { items: Limit[] };
  const answer = await jonas.api.put(path, { data: { items: change(items) }, headers: { 'if-match': read.headers().etag } });
  expect(answer.status()).toBe(200);
}

const keptIn = async (page: Page, id: string) =>
  ((await (await page.request.get(`${server.url}/api/projects/${id}/limits`)).json()) as { items: Limit[] }).items;

const ms: Limit = { quantity: 'ms', bound: 'max', limit: 1.7, target: 1.6, source: 'team rule 4' };
const gain: Limit = { quantity: 'gainMargin', bound: 'min', limit: 10 ** (6 / 20), target: null, source: 'team rule 4' };
const phase: Limit = { quantity: 'phaseMargin', bound: 'min', limit: 45, target: null, source: 'team rule 4' };
const field = { ms: 'Ms, at most, limit', gain: 'Gain margin, at least, limit, in dB', phase: 'Phase margin, at least, limit, in degrees' };

describe.each(['phone', 'wide'] as const)('limits at the %s size', (size) => {
  it('are typed, said wrong at the field, kept, and judged again', async () => {
    const before = await openLimits(size);
    await jonasKeeps(before.id, () => [ms, gain, phase]);
    await before.context.close();

    const { page, context, complaints, visitor, id } = await openLimits(size);
    expect(await axeFindings(page)).toEqual([]);
    await visitor.fill(field.gain, 'much');
    await visitor.fill('Ms, at most, target', '1.9');
    await visitor.sees('A number, as in 0.35.');
    await visitor.sees('A target lies inside its limit: no more than 1.70.');
    await visitor.press('Keep, judge again');
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('demand-ms-max-target');

    await visitor.fill('Ms, at most, target', '');
    await visitor.fill(field.gain, '6.5');
    await page.reload();
    await visitor.sees('A draft stays on this device.');
    expect(await page.getByLabel(field.gain, { exact: true }).inputValue()).toBe('6.5');
    await visitor.press('Keep, judge again');
    await visitor.sees(/Kept\. .+, rev \d+, judged again: (pass|tight|fail)\./);
    const [, kept] = await keptIn(page, id);
    expect(kept.limit).toBeCloseTo(10 ** (6.5 / 20), 14);
    await page.reload();
    await page.getByLabel(field.gain, { exact: true }).waitFor();
    expect(await page.getByLabel(field.gain, { exact: true }).inputValue()).toBe('6.5');
    expect(await axeFindings(page)).toEqual([]);
    expect(complaints).toEqual([]);
    await context.close();
  }, 180_000);

  it('of two people come together: the second sees both and loses nothing', async () => {
    const { page, context, visitor, id } = await openLimits(size);
    await visitor.fill(field.ms, '1.66');
    // Before the page looks again by itself, so that the server is the one that says it.
    await jonasKeeps(id, (limits) => limits.map((limit) => (limit.quantity === 'phaseMargin' ? { ...limit, limit: 47 } : limit)));
    await visitor.press('Keep, judge again');
    const panel = page.getByRole('region', { name: 'Theirs beside yours' });
    await panel.getByText(/Jonas Abara changed the limits/).waitFor();
    await panel.getByText('at least 47°').waitFor();
    await panel.getByText('at most 1.66').waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await panel.getByRole('button', { name: 'Put mine on top' }).click();
    expect(await page.getByLabel(field.phase, { exact: true }).inputValue()).toBe('47');
    expect(await page.getByLabel(field.ms, { exact: true }).inputValue()).toBe('1.66');
    await visitor.press('Keep, judge again');
    await visitor.sees(/judged again/);
    const kept = await keptIn(page, id);
    expect(kept.map(({ quantity, limit }) => [quantity, limit])).toEqual(
      expect.arrayContaining([
        ['ms', 1.66],
        ['phaseMargin', 47],
      ]),
    );
    await context.close();
  });

  it('that someone else changes while one looks are noticed', async () => {
    const { page, context, visitor, id } = await openLimits(size);
    await jonasKeeps(id, (limits) => limits.map((limit) => (limit.quantity === 'ms' ? { ...limit, limit: 1.55 } : limit)));
    // Coming back to the page asks at once; the wide one waits until it asks by itself.
    if (size === 'phone') await page.evaluate(() => window.dispatchEvent(new Event('visibilitychange')));
    await visitor.sees(/Jonas Abara changed the limits/);
    expect(await page.getByLabel(field.ms, { exact: true }).inputValue()).toBe('1.55');
    await context.close();
  });

  it('start from a set, after what it replaces was shown, and go back', async () => {
    const { page, context, visitor } = await openLimits(size);
    await visitor.press(size === 'phone' ? 'Sets' : 'Start from a set');
    await page.getByRole('menuitem', { name: /^Ms only/ }).click();
    const dialog = page.getByRole('dialog', { name: /Start from the set/ });
    await dialog.getByText('Phase margin').waitFor();
    await dialog.getByRole('button', { name: 'Replace' }).click();
    expect(await page.getByRole('list', { name: 'Limits' }).getByRole('listitem').count()).toBe(1);
    await visitor.press('Undo');
    expect(await page.getByRole('list', { name: 'Limits' }).getByRole('listitem').count()).toBe(3);
    await context.close();
  });
});

it('are only read by who may not change them', async () => {
  const { page, context, visitor } = await openLimits('wide', crew);
  await visitor.sees('Sensitivity peak, Ms');
  expect(await page.getByRole('textbox').count()).toBe(0);
  expect(await page.getByRole('button', { name: /Keep|Start from/ }).count()).toBe(0);
  await context.close();
});
