import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
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

const numerator = 'Numerator, highest power first';
const denominator = 'Denominator, highest power first';

describe.each(Object.keys(sizes) as SizeName[])('the plant editor at the %s size', (size) => {
  const open = async () => {
    const { page, context } = await openPage(browser, size);
    const visitor = new Visitor(page, server.url);
    await visitor.isSignedInAs(engineer);
    await visitor.open(`/projects/${await visitor.firstProjectId()}/plant`);
    await visitor.sees('Revisions');
    return { page, context, visitor };
  };

  it.each([
    ['a negative dead time', 'Dead time', '-0.08', /Dead time is 0 or more/],
    ['an improper plant', numerator, '1 0 0 0 1', /proper|order|degree/i],
    ['a denominator of zeros', denominator, '0 0', /not zero/],
    ['letters where numbers belong', denominator, '0.35, one', /number/i],
  ])('answers %s at the field and keeps what was typed', async (_what, field, text, answer) => {
    const { page, context, visitor } = await open();
    await visitor.fill(field, text);
    await visitor.press(/^Keep as plant/);
    await visitor.sees(answer);
    expect(await page.getByLabel(field, { exact: true }).inputValue()).toBe(text);
    expect(await page.getByLabel('Name', { exact: true }).inputValue()).not.toBe('');
    await context.close();
  });

  it('keeps a draft over a reload and reads the plant back in words', async () => {
    const { page, context, visitor } = await open();
    await visitor.fill(denominator, '0.5 1 0');
    await visitor.sees(/[Ii]ntegrat/);
    await page.reload();
    await visitor.sees('Revisions');
    expect(await page.getByLabel(denominator, { exact: true }).inputValue()).toBe('0.5 1 0');
    await context.close();
  });
});
