import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
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

/** Each screen by its address, with something that stands on it once it is there. */
const outside = { '/sign-in': 'Sign in', '/sign-up': 'Make the account', '/forgot-password': 'Send the link' };
const inside = (project: string, analysis: string) => ({
  '/': 'Wet-track speed hold',
  '/account': 'Sign out',
  [`/projects/${project}`]: 'Where it stands',
  [`/projects/${project}/plant`]: 'Revisions',
  [`/projects/${project}/bench`]: 'Delay margin',
  [`/projects/${project}/analyses`]: 'An analysis never changes.',
  [`/projects/${project}/analyses/${analysis}`]: 'Compute again',
  '/no-such-page': /not here|no such|no page/i,
});

describe.each(Object.keys(sizes) as SizeName[])('at the %s size', (size) => {
  it.each(['light', 'dark'] as const)(
    'every screen opens by its address, complains of nothing and passes axe in the %s theme',
    async (theme) => {
      const { page, context, complaints } = await openPage(browser, size, theme);
      const visitor = new Visitor(page, server.url);
      const findings: string[] = [];
      const look = async (screens: Record<string, string | RegExp>) => {
        for (const [path, text] of Object.entries(screens)) {
          await visitor.open(path);
          await page.getByText(text).first().waitFor({ state: 'attached' });
          findings.push(...(await axeFindings(page)).map((finding) => `${path} ${finding}`));
        }
      };
      await look(outside);
      await visitor.isSignedInAs(engineer);
      // Being told 401 before signing in is an answer, not a complaint.
      complaints.length = 0;
      const project = await visitor.firstProjectId();
      const analyses = (await (await page.request.get(`${server.url}/api/projects/${project}/analyses`)).json()) as {
        items: { id: string }[];
      };
      await look(inside(project, analyses.items[0].id));
      expect(findings).toEqual([]);
      expect(complaints).toEqual([]);
      await context.close();
    },
  );

  it('nothing scrolls sideways', async () => {
    const { page, context } = await openPage(browser, size);
    const visitor = new Visitor(page, server.url);
    await visitor.isSignedInAs(engineer);
    const project = await visitor.firstProjectId();
    const tooWide: string[] = [];
    for (const [path, text] of Object.entries(inside(project, 'none'))) {
      await visitor.open(path);
      await page
        .getByText(text)
        .first()
        .waitFor({ state: 'attached', timeout: 5000 })
        .catch(() => undefined);
      const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
      if (over > 0) tooWide.push(`${path} by ${over}`);
    }
    expect(tooWide).toEqual([]);
    await context.close();
  });
});

it('asks for a sign-in and leads back to the page that was asked for', async () => {
  const { page, context } = await openPage(browser, 'wide');
  const visitor = new Visitor(page, server.url);
  await visitor.isSignedInAs(engineer);
  const path = `/projects/${await visitor.firstProjectId()}/plant`;
  await context.clearCookies();
  await visitor.open(path);
  await page.waitForURL(/sign-in/);
  await visitor.signIn(engineer);
  await page.waitForURL(`**${path}`);
  await context.close();
});

it('does not tell a stranger that a project exists', async () => {
  const { page, context } = await openPage(browser, 'phone');
  const visitor = new Visitor(page, server.url);
  await visitor.isSignedInAs(engineer);
  const project = await visitor.firstProjectId();
  await context.clearCookies();
  await page.request.post(`${server.url}/api/auth/sign-up/email`, {
    data: { name: 'Ines Vale', email: 'ines@other.example', password: 'another-long-password' },
    headers: { origin: server.url },
  });
  await visitor.open(`/projects/${project}/bench`);
  await visitor.sees(/not here|no such|not yours/i);
  expect(await page.getByText('Wet-track').count()).toBe(0);
  await context.close();
});
