import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openPage, type SizeName } from '../support/browser';
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

const visit = async (size: SizeName = 'wide') => {
  const { page, context } = await openPage(browser, size);
  return { page, context, visitor: new Visitor(page, server.url) };
};

const first = 'the-first-long-password';
const second = 'a-second-long-password';

/** A newcomer with a session in a browser of their own. */
async function newcomer(email: string, size: SizeName = 'wide') {
  const opened = await visit(size);
  const data = { name: 'Rafa Lindqvist', email, password: first };
  const answer = await opened.page.request.post(`${server.url}/api/auth/sign-up/email`, { data, headers: { origin: server.url } });
  expect(answer.status()).toBe(200);
  return { ...opened, person: { email, password: first } };
}

/** The link in the newest mail to an address whose subject says so. */
async function mailedLink(email: string, subject: RegExp): Promise<string> {
  const answer = await fetch(`${server.url}/api/dev/mail?to=${encodeURIComponent(email)}`);
  const { items } = (await answer.json()) as { items: { subject: string; links: string[] }[] };
  const mail = items.find((item) => subject.test(item.subject));
  if (!mail) throw new Error(`No such mail to ${email}.`);
  return mail.links[0];
}

describe('the sign-up page', () => {
  it('says at the field what is wrong, and keeps what was typed', async () => {
    const { page, context, visitor } = await visit('phone');
    await visitor.open('/sign-up');
    await visitor.fill('Name', 'Rafa');
    await visitor.fill('E-mail', engineer.email);
    await visitor.fill('Password', 'short');
    await visitor.press('Make the account');
    await visitor.sees(/12 characters or more|at least 12/);
    await visitor.fill('Password', first);
    await visitor.press('Make the account');
    await visitor.sees(/already|has an account/);
    expect(await page.getByLabel('E-mail', { exact: true }).inputValue()).toBe(engineer.email);
    await context.close();
  });
});

describe('a forgotten password', () => {
  it('is chosen anew by the mailed link, once, and signs every device out', async () => {
    const { page: before, context: old, person } = await newcomer('reset@kerb.example', 'phone');
    const { page, context, visitor } = await visit('phone');
    await visitor.open('/sign-in');
    await visitor.signIn({ ...person, password: 'not-the-password' });
    await visitor.sees('That e-mail and password do not match.');
    await page.getByRole('link', { name: 'Password forgotten' }).click();
    await visitor.fill('E-mail', person.email);
    await visitor.press('Send the link');
    await visitor.sees('Look in your mail.');

    const link = await mailedLink(person.email, /new password/);
    await page.goto(link);
    await visitor.fill('New password', second);
    await visitor.press('Change the password');
    await visitor.sees('The password is changed.');
    await page.getByRole('link', { name: 'Sign in', exact: true }).click();
    await visitor.signIn({ ...person, password: second });
    await visitor.sees('No project yet');

    await before.goto(`${server.url}/account`);
    await before.waitForURL(/sign-in/);
    await page.goto(link);
    await visitor.fill('New password', 'and-a-third-password');
    await visitor.press('Change the password');
    await visitor.sees(/ended|used/);
    await Promise.all([old.close(), context.close()]);
  });
});

describe('an address', () => {
  it('is verified by the mailed link', async () => {
    const { page, context, visitor, person } = await newcomer('verify@kerb.example');
    await visitor.open('/account');
    await visitor.sees(`${person.email}, not verified`);
    await visitor.press('Send the mail');
    await visitor.sees(/A link is on its way/);
    await page.goto(await mailedLink(person.email, /[Cc]onfirm/));
    await visitor.sees('Your address is verified.');
    await visitor.open('/account');
    await visitor.sees(`${person.email}, verified`);
    await context.close();
  });
});

describe('a device', () => {
  it('is signed out from another one, at once', async () => {
    const { page, context, visitor, person } = await newcomer('devices@kerb.example');
    const other = await visit('phone');
    await other.visitor.isSignedInAs(person);
    await other.visitor.open('/account');
    await other.visitor.sees('Signed in on');

    await visitor.open('/account');
    const signOut = page.getByRole('button', { name: /^Sign out .+/ });
    await signOut.waitFor();
    expect(await signOut.count()).toBe(1);
    await signOut.click();
    await signOut.waitFor({ state: 'detached' });

    expect((await other.page.request.get(`${server.url}/api/me`)).status()).toBe(401);
    await other.page.getByRole('radio', { name: 'Hz' }).click();
    await other.page.waitForURL(/sign-in/);
    await Promise.all([context.close(), other.context.close()]);
  });

  it('stays signed in when the password is changed on it, the others do not', async () => {
    const { page, context, visitor, person } = await newcomer('change@kerb.example');
    const other = await visit();
    await other.visitor.isSignedInAs(person);
    await visitor.open('/account');
    await visitor.press('Change the password');
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Password now', { exact: true }).fill('not-the-password');
    await dialog.getByLabel('New password', { exact: true }).fill(second);
    await dialog.getByRole('button', { name: 'Change the password' }).click();
    await dialog
      .getByRole('alert')
      .getByText(/password/i)
      .waitFor();
    await dialog.getByLabel('Password now', { exact: true }).fill(first);
    await dialog.getByRole('button', { name: 'Change the password' }).click();
    await visitor.sees('Password changed.');
    await page.getByRole('button', { name: /^Sign out .+/ }).waitFor({ state: 'detached' });
    await page.reload();
    await visitor.sees('Signed in on');
    expect((await other.page.request.get(`${server.url}/api/me`)).status()).toBe(401);
    await Promise.all([context.close(), other.context.close()]);
  });
});

describe.each(['phone', 'wide'] as const)('units and theme at the %s size', (size) => {
  it('are chosen once and hold on every screen and after a reload', async () => {
    const { page, context, visitor } = await visit(size);
    await visitor.isSignedInAs(engineer);
    await visitor.open('/account');
    await page.getByRole('radio', { name: 'Hz' }).click();
    await page.getByRole('radio', { name: 'factor' }).click();
    await page.getByRole('radio', { name: 'dark' }).click();
    await visitor.sees(/crossover 0\.35 Hz, gain margin 3\.09/);
    await page.reload();
    await visitor.sees(/crossover 0\.35 Hz/);

    const project = `/projects/${await visitor.firstProjectId()}`;
    const analyses = (await (await page.request.get(`${server.url}/api${project}/analyses`)).json()) as { items: { id: string }[] };
    for (const path of [project, `${project}/plant`, `${project}/bench`, `${project}/analyses/${analyses.items[0].id}`]) {
      await visitor.open(path);
      await page.getByText(/\d Hz/).first().waitFor({ state: 'attached' });
      expect(await page.getByText(/\d rad\/s|\d dB/).count()).toBe(0);
      expect(await page.evaluate(() => getComputedStyle(document.body).backgroundColor)).toBe('rgb(7, 12, 10)');
    }
    await visitor.open('/account');
    for (const choice of ['rad/s', 'dB', 'system']) await page.getByRole('radio', { name: choice }).click();
    await visitor.sees(/crossover 2\.22 rad\/s, gain margin 9\.8 dB/);
    await context.close();
  });
});
