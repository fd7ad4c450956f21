import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
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
const outside = {
  '/sign-in': 'Sign in',
  '/sign-up': 'Make the account',
  '/forgot-password': 'Send the link',
  '/invitation': 'All projects',
};
const inside = (project: string, analysis: string) => ({
  '/': 'Wet-track speed hold',
  '/account': 'Sign out',
  [`/projects/${project}`]: 'Where it stands',
  [`/projects/${project}/plant`]: 'Revisions',
  [`/projects/${project}/bench`]: /worst of \d+/,
  [`/projects/${project}/cases`]: 'Open on bench',
  [`/projects/${project}/limits`]: 'A target is easier to live with.',
  [`/projects/${project}/members`]: 'Who may do what',
  [`/projects/${project}/activity`]: /This is where it begins|Earlier/,
  [`/projects/${project}/analyses`]: 'An analysis never changes.',
  [`/projects/${project}/analyses/${analysis}`]: 'Compute again',
  '/no-such-page': /not here|no such|no page/i,
});

/** What is wrong with the page as it stands: axe's findings, those of its colours in the dark theme too, and anything that scrolls sideways. */
async function faults(page: Page): Promise<string[]> {
  const light = await axeFindings(page);
  await page.emulateMedia({ colorScheme: 'dark' });
  await page.locator('html[data-theme=dark]').waitFor({ state: 'attached' });
  const dark = await axeFindings(page, 'colours');
  await page.emulateMedia({ colorScheme: 'light' });
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  return [...light, ...dark.map((finding) => `in dark: ${finding}`), ...(over > 0 ? [`scrolls sideways by ${over}`] : [])];
}

it.each(Object.keys(sizes) as SizeName[])(
  'every screen opens by its address, complains of nothing, passes axe in both themes and never scrolls sideways at the %s size',
  async (size) => {
    const { page, context, complaints } = await openPage(browser, size);
    const visitor = new Visitor(page, server.url);
    const found: string[] = [];
    const look = async (screens: Record<string, string | RegExp>) => {
      for (const [path, text] of Object.entries(screens)) {
        await visitor.open(path);
        await page.getByText(text).first().waitFor({ state: 'attached' });
        found.push(...(await faults(page)).map((fault) => `${path} ${fault}`));
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
    expect(found).toEqual([]);
    expect(complaints).toEqual([]);
    await context.close();
  },
  240_000,
);

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
