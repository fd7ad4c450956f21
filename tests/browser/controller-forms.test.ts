import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BenchPage } from '../support/bench-page';
import { launchBrowser, openPage, sizes, type SizeName } from '../support/browser';
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

async function atTheBench(size: SizeName) {
  const { page, context } = await openPage(browser, size);
  const visitor = new Visitor(page, server.url);
  await visitor.isSignedInAs(engineer);
  const bench = new BenchPage(visitor, size);
  const project = await visitor.projectId('Pit-lane limiter');
  await bench.open(project);
  // The design beside it comes a moment later, and every chart's description names it.
  await bench.chart(/Beside it, dashed/).waitFor({ state: 'attached' });
  return { page, context, visitor, bench, project };
}

describe.each(Object.keys(sizes) as SizeName[])('a controller at the %s size', (size) => {
  it('in three forms gives the same screen', async () => {
    const { context, bench } = await atTheBench(size);
    const parallel = await bench.strip();
    const charts = await bench.descriptions();
    for (const form of ['Series', 'Ideal'] as const) {
      await bench.inSettings((sheet) => sheet.getByRole('radio', { name: form }).click());
      await bench.gain('Td').waitFor();
      await expect.poll(() => bench.strip()).toBe(parallel);
      await expect.poll(() => bench.descriptions()).toEqual(charts);
    }
    await context.close();
  });

  it('has filters that change the numbers, and undo brings them back', async () => {
    const { context, visitor, bench } = await atTheBench(size);
    const without = await bench.strip();
    await bench.inSettings((sheet) => sheet.getByRole('button', { name: 'Add notch' }).click());
    await expect.poll(() => bench.strip()).not.toBe(without);
    expect(await bench.status().innerText()).toMatch(/Not kept/);
    await visitor.sees(/notch \d+\.\d°/);
    await visitor.press('Undo Filters');
    await expect.poll(() => bench.strip()).toBe(without);
    await context.close();
  });

  it('kept in another form and with a filter is found again so, and the server agrees', async () => {
    const { page, context, visitor, bench, project } = await atTheBench(size);
    await bench.inSettings(async (sheet) => {
      await sheet.getByRole('radio', { name: 'Series' }).click();
      await sheet.getByRole('button', { name: 'Add low-pass' }).click();
      await sheet.getByLabel('Time constant', { exact: true }).fill(size === 'phone' ? '0.011' : '0.012');
    });
    await bench.keep().click();
    await visitor.sees(/Server and bench agree to 6 digits\./);
    const kept = await bench.strip();
    await page.reload();
    await bench.ready();
    await expect.poll(() => bench.strip()).toBe(kept);
    await bench.gain('Td').waitFor();
    await visitor.open(`/projects/${project}/analyses`);
    await page
      .getByRole('link', { name: /Limiter, rev \d+/ })
      .first()
      .click();
    await visitor.sees(/series form/);
    await visitor.sees(`time constant ${size === 'phone' ? '0.011' : '0.012'} s`);
    await visitor.open(`/projects/${project}/bench`);
    await bench.ready();
    await bench.inSettings(async (sheet) => {
      await sheet.getByRole('button', { name: 'Remove Low-pass 1' }).click();
      await sheet.getByRole('radio', { name: 'Parallel' }).click();
    });
    await bench.keep().click();
    await visitor.sees(/Server and bench agree to 6 digits\./);
    await context.close();
  });

  it('loses its integral action in All settings alone, and gets it back on the bench', async () => {
    const { page, context, visitor, bench } = await atTheBench(size);
    await bench.inSettings((sheet) => sheet.getByRole('radio', { name: 'Ideal' }).click());
    const before = await bench.strip();
    await bench.inSettings((sheet) => sheet.getByRole('radio', { name: 'Off', exact: true }).click());
    await expect.poll(() => bench.strip()).not.toBe(before);
    await bench.choose('Ti');
    await page.getByText('No integral action.').first().waitFor();
    await visitor.press('Switch it on');
    await expect.poll(() => bench.strip()).toBe(before);
    if (size === 'wide') {
      await bench.enter('Ti', '0');
      await visitor.sees('Ti is more than 0. All settings switch integral action off.');
      expect(await bench.gain('Ti').inputValue()).toBe('0');
    }
    await context.close();
  });
});
