/**
 * Pictures of every screen from the demo data: phone and wide, light and dark, into screenshots/;
 * the README's picture of the bench into docs/pictures/.
 *   npm run screenshots
 */
import { copyFileSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { startBuiltServer } from '../tests/support/built-server';
import { launchBrowser, openPage, type SizeName } from '../tests/support/browser';
import { root } from './root.mjs';

const DEMO = { email: 'mira@heron-racing.example', password: 'kerb-and-apex-14' };
const OUT = join(root, 'screenshots');
const SETTLE_MS = 900;

interface Listed {
  items: { id: string }[];
}

const get = (page: Page, path: string) => page.evaluate(async (url) => (await fetch(url)).json(), path) as Promise<Listed>;

async function screens(page: Page): Promise<Record<string, string>> {
  const project = (await get(page, '/api/projects')).items[0].id;
  const analysis = (await get(page, `/api/projects/${project}/analyses`)).items[0].id;
  const base = `/projects/${project}`;
  return {
    projects: '/',
    home: base,
    plant: `${base}/plant`,
    bench: `${base}/bench`,
    cases: `${base}/cases`,
    limits: `${base}/limits`,
    members: `${base}/members`,
    activity: `${base}/activity`,
    analyses: `${base}/analyses`,
    analysis: `${base}/analyses/${analysis}`,
    account: '/account',
  };
}

async function signIn(page: Page, url: string) {
  const answer = await page.request.post(`${url}/api/auth/sign-in/email`, { data: DEMO, headers: { origin: url } });
  if (!answer.ok()) throw new Error(`sign-in answered ${answer.status()}`);
}

/** The bench is whole once every gain on it has its marks, which it looks for at rest: the active one on a phone, all on a wide screen. */
const benchRests = (page: Page, size: SizeName) =>
  page
    .getByText(/^Every limit holds/)
    .nth(size === 'wide' ? 3 : 0)
    .waitFor({ state: 'attached' });

async function picture(page: Page, path: string, name: string, rests?: () => Promise<void>) {
  await page.goto(`${server.url}${path}`, { waitUntil: 'networkidle' });
  await page.getByRole('heading', { level: 1 }).first().waitFor({ state: 'attached' });
  await rests?.();
  await page.waitForTimeout(SETTLE_MS);
  await page.screenshot({ path: join(OUT, `${name}.png`) });
}

mkdirSync(OUT, { recursive: true });
const server = await startBuiltServer();
const browser = await launchBrowser();
for (const size of ['phone', 'wide'] as SizeName[]) {
  for (const theme of ['light', 'dark'] as const) {
    const { page, context } = await openPage(browser, size, theme);
    await picture(page, '/sign-in', `sign-in-${size}-${theme}`);
    await signIn(page, server.url);
    for (const [name, path] of Object.entries(await screens(page))) {
      await picture(page, path, `${name}-${size}-${theme}`, name === 'bench' ? () => benchRests(page, size) : undefined);
    }
    await context.close();
  }
}
await browser.close();
await server.stop();
mkdirSync(join(root, 'docs', 'pictures'), { recursive: true });
copyFileSync(join(OUT, 'bench-wide-light.png'), join(root, 'docs', 'pictures', 'bench-wide.png'));
copyFileSync(join(OUT, 'bench-phone-light.png'), join(root, 'docs', 'pictures', 'bench-phone.png'));
