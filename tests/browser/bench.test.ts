import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BenchPage } from '../support/bench-page';
import { launchBrowser, openPage, sizes, type SizeName } from '../support/browser';
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

async function atTheBench(size: SizeName, person = engineer) {
  const opened = await openPage(browser, size);
  const visitor = new Visitor(opened.page, server.url);
  await visitor.isSignedInAs(person);
  const bench = new BenchPage(visitor, size);
  const project = await visitor.projectId('Pit-lane limiter');
  await bench.open(project);
  return { ...opened, visitor, bench, project };
}

describe.each(Object.keys(sizes) as SizeName[])('the bench at the %s size', (size) => {
  it('takes a gain back and forth, and a draft survives closing the page', async () => {
    const { page, context, visitor, bench, project } = await atTheBench(size);
    const kept = await bench.strip();
    await bench.nudgeUp('Kp');
    await bench.nudgeUp('Kp');
    await expect.poll(() => bench.strip()).not.toBe(kept);
    const moved = await bench.strip();
    expect(await bench.status().innerText()).toMatch(/Not kept/);
    await page.close();

    const again = await context.newPage();
    const later = new BenchPage(new Visitor(again, server.url), size);
    await later.open(project);
    await expect.poll(() => later.strip()).toBe(moved);
    await later.visitor.press(/^Undo/);
    await later.visitor.press(/^Undo/);
    await expect.poll(() => later.strip()).toBe(kept);
    await later.visitor.press(/^Redo/);
    await later.visitor.press(/^Redo/);
    await expect.poll(() => later.strip()).toBe(moved);
    expect(visitor.url).toBe(server.url);
    await context.close();
  });

  it('moves a gain by the keys of its rule', async () => {
    const { context, bench } = await atTheBench(size);
    const rule = bench.rule('Kp');
    const before = Number(await rule.getAttribute('aria-valuenow'));
    await rule.focus();
    await rule.press('ArrowRight');
    await expect.poll(async () => Number(await rule.getAttribute('aria-valuenow'))).toBeGreaterThan(before);
    await context.close();
  });

  it('says that a loop is unstable, and strikes out what has no meaning there', async () => {
    const { page, context, bench } = await atTheBench(size);
    await bench.type('Kp', '25');
    await expect.poll(() => bench.strip()).toMatch(/unstable/i);
    expect(await bench.strip()).toMatch(/Margins have no meaning/);
    const struck = page.getByRole('region', { name: 'Verdict and margins' }).getByLabel(/no meaning while unstable/);
    expect(await struck.count()).toBe(4);
    await page
      .getByText(/encirclements [1-9]\d*, needed 0/)
      .first()
      .waitFor({ state: 'attached' });
    await context.close();
  });

  it('carries one frequency through every chart', async () => {
    const { page, context } = await atTheBench(size);
    const cursor = page.getByRole('slider', { name: 'Cursor, frequency', exact: true }).first();
    const plane = page.getByRole('slider', { name: 'Cursor, frequency along L' }).first();
    await cursor.focus();
    for (let i = 0; i < 7; i += 1) await cursor.press('ArrowRight');
    const value = await cursor.getAttribute('aria-valuenow');
    expect(Number(value)).toBeGreaterThan(0);
    expect(await plane.getAttribute('aria-valuenow')).toBe(value);
    await context.close();
  });

  it('has a table behind every chart', async () => {
    const { page, context } = await atTheBench(size);
    const tables = page.getByRole('button', { name: /^Table of/ });
    await expect.poll(() => tables.count()).toBeGreaterThanOrEqual(3);
    await tables.first().click();
    const rows = page.getByRole('table').first().getByRole('row');
    await expect.poll(() => rows.count()).toBeGreaterThan(10);
    await context.close();
  });

  it('without signal the draft stays and keeping says what it needs', async () => {
    const { page, context, bench } = await atTheBench(size);
    await bench.nudgeUp('Ki');
    await context.setOffline(true);
    await page
      .getByText(/No signal/)
      .first()
      .waitFor();
    const keep = bench.keep();
    if (await keep.isEnabled()) await keep.click();
    await page
      .getByText(/needs signal/)
      .first()
      .waitFor();
    await context.setOffline(false);
    expect(await bench.status().innerText()).toMatch(/Not kept/);
    await context.close();
  });

  it('lets a viewer look and keep nothing', async () => {
    const { page, context, bench } = await atTheBench(size, crew);
    await bench.nudgeUp('Kp');
    await page.getByText(/You are a viewer here/).waitFor();
    expect(await page.getByRole('button', { name: /^Keep/ }).count()).toBe(0);
    await context.close();
  });

  it('shows no focus before a key is pressed', async () => {
    const { page, context } = await atTheBench(size);
    const ringed = () => page.evaluate(() => document.querySelectorAll(':focus-visible').length);
    expect(await ringed()).toBe(0);
    await page.keyboard.press('Tab');
    expect(await page.evaluate(() => document.activeElement?.matches('a, button, input, [role=slider], [role=tab]'))).toBe(true);
    await context.close();
  });

  it('gives the keyboard to the chart whose letter is pressed', async () => {
    const { page, context } = await atTheBench(size);
    const focused = () => page.evaluate(() => document.activeElement?.getAttribute('aria-label') ?? '');
    await page.getByRole('slider', { name: 'Cursor, frequency along L' }).waitFor({ state: 'attached' });
    await page.keyboard.press('n');
    await expect.poll(focused).toBe('Cursor, frequency along L');
    await page.keyboard.press('t');
    await expect.poll(focused).toBe('Cursor, time');
    await page.keyboard.press('b');
    await expect.poll(focused).toBe('Cursor, frequency');
    await context.close();
  });

  it('draws A, B and every panel to the end of one time axis', async () => {
    const { page, context, bench } = await atTheBench(size);
    await bench.type('Kp', '0.7');
    await page.keyboard.press('Escape');
    if (size === 'phone') await page.getByRole('tab', { name: 'Load' }).click();
    const ends = () =>
      page.evaluate(() => {
        const chart = [...document.querySelectorAll('[role=img]')]
          .filter((image) => /load at the command/.test(image.ariaLabel ?? ''))
          .at(-1);
        const curves = [...(chart?.querySelectorAll('path[stroke-linejoin=round]') ?? [])];
        return curves.map((path) => Math.round((path as SVGPathElement).getBBox().x + (path as SVGPathElement).getBBox().width));
      });
    await expect.poll(async () => (await ends()).length).toBeGreaterThanOrEqual(2);
    await expect.poll(async () => new Set(await ends()).size).toBe(1);
    await context.close();
  });

  it('keeps nothing over what was kept meanwhile on another device, and puts the draft on top when told to', async () => {
    const here = await atTheBench(size);
    const there = await atTheBench(size);
    await there.bench.nudgeUp('Kd');
    await there.bench.keep().click();
    await there.visitor.sees(/Kept as rev/);
    await here.bench.nudgeUp('Ki');
    await here.bench.keep().click();
    await here.visitor.sees(/You kept rev \d+ meanwhile\./);
    expect(await here.bench.status().innerText()).toMatch(/Not kept/);
    await here.visitor.press(/^Put mine on top of rev/);
    await here.bench.keep().click();
    await here.visitor.sees(/Server and bench agree to 6 digits/);
    await here.context.close();
    await there.context.close();
  });
});
