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
  expect(await server.stop()).toBe(0);
});

async function visit(size: SizeName) {
  const { page, context } = await openPage(browser, size);
  const visitor = new Visitor(page, server.url);
  return { page, context, visitor, bench: new BenchPage(visitor, size) };
}

describe.each(Object.keys(sizes) as SizeName[])('a controls engineer at the %s size', (size) => {
  const kp = size === 'phone' ? '1.61' : '1.42';

  it('signs in to the demo, moves a gain, sees every curve follow, keeps, reloads and finds it', async () => {
    const { page, context, visitor, bench } = await visit(size);
    await visitor.open('/');
    await visitor.signIn(engineer);
    await page.getByRole('link', { name: /^Wet-track speed hold/ }).click();
    await visitor.sees('Where it stands');
    await page.getByRole('link', { name: 'Bench', exact: true }).click();
    await bench.ready();

    const before = await bench.descriptions();
    const strip = await bench.strip();
    expect(before.length).toBeGreaterThanOrEqual(3);
    await bench.type('Kp', kp);
    await expect.poll(() => bench.strip()).not.toBe(strip);
    await expect.poll(async () => (await bench.descriptions()).filter((text, i) => text === before[i])).toEqual([]);

    await bench.keep().click();
    await visitor.sees(/Server and bench agree to 6 digits\./);
    const kept = await bench.strip();
    await page.reload();
    await bench.ready();
    expect(await bench.strip()).toBe(kept);
    await visitor.open(`/projects/${await visitor.firstProjectId()}/analyses`);
    await page
      .getByRole('link', { name: /Speed hold, rev \d+/ })
      .first()
      .click();
    await visitor.sees(kp);
    await context.close();
  });

  it('starts from nothing: an account, a project, a plant, gains, and what was kept is found again', async () => {
    const { page, context, visitor, bench } = await visit(size);
    await visitor.open('/sign-up');
    await visitor.fill('Name', 'Rafa Lindqvist');
    await visitor.fill('E-mail', `rafa-${size}@kerb.example`);
    await visitor.fill('Password', 'a-long-enough-password');
    await visitor.press('Make the account');
    await visitor.sees('No project yet');
    await page.getByRole('button', { name: 'New project' }).last().click();
    await visitor.fill('Name of the loop', 'Pit speed');
    await visitor.fill('Car', 'Plover 2');
    await visitor.press('Make the project');
    await visitor.press('Enter the plant');

    await visitor.fill('Name', 'Torque to speed');
    await visitor.fill('Numerator, highest power first', '2.1');
    await visitor.fill('Denominator, highest power first', '0.35 1 0');
    await visitor.fill('Dead time', '0.08');
    await visitor.press('Keep as plant rev 1');
    await visitor.sees('rev 1');
    await page.getByRole('link', { name: 'Bench', exact: true }).click();
    await bench.ready();
    await bench.type('Kp', '1.2');
    await bench.type('Ki', '0.4');
    await bench.keep().click();
    await visitor.sees(/Server and bench agree to 6 digits\./);
    const strip = await bench.strip();
    await page.reload();
    await bench.ready();
    expect(await bench.strip()).toBe(strip);
    await visitor.open('/');
    await page.getByRole('link', { name: /^Pit speed/ }).waitFor();
    await context.close();
  });
});
