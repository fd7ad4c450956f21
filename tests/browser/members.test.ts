import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { axeFindings, launchBrowser, openPage, type SizeName } from '../support/browser';
import { startBuiltServer, type BuiltServer } from '../support/built-server';
import { engineer, reviewer } from '../support/demo-people';
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

const visit = async (size: SizeName) => {
  const { page, context, complaints } = await openPage(browser, size);
  return { page, context, complaints, visitor: new Visitor(page, server.url) };
};

async function invitationTo(email: string): Promise<string> {
  const answer = await fetch(`${server.url}/api/dev/mail?to=${encodeURIComponent(email)}`);
  const { items } = (await answer.json()) as { items: { subject: string; links: string[] }[] };
  const letter = items.find(({ subject }) => subject.includes('invites you'));
  if (!letter) throw new Error(`No invitation was mailed to ${email}.`);
  return letter.links[0];
}

async function openMembers(size: SizeName) {
  const opened = await visit(size);
  await opened.visitor.isSignedInAs(engineer);
  const id = await opened.visitor.firstProjectId();
  await opened.visitor.open(`/projects/${id}/members`);
  await opened.visitor.sees('Invited, not here yet');
  return { ...opened, id };
}

/** On a phone the form stands in a dialog, opened from the foot. */
async function invite({ page, visitor }: Pick<Awaited<ReturnType<typeof visit>>, 'page' | 'visitor'>, size: SizeName, email: string) {
  const dialog = page.getByRole('dialog', { name: 'Invite' });
  if (size === 'phone' && !(await dialog.isVisible())) await visitor.press('Invite');
  await visitor.fill('E-mail of someone new', email);
  await (size === 'phone' ? dialog : page).getByRole('button', { name: 'Invite', exact: true }).click();
}

describe.each(['phone', 'wide'] as const)('members at the %s size', (size) => {
  it('are invited by mail, come in by its link with an account they make for it, are given a role and taken out, at once', async () => {
    const owner = await openMembers(size);
    expect(await axeFindings(owner.page)).toEqual([]);
    await invite(owner, size, 'no address');
    await owner.visitor.sees('An e-mail address looks like name@team.example.');
    await invite(owner, size, 'rasmus@heron-racing.example');
    await owner.visitor.sees(/invited already/);
    const email = `lena-${size}@kerb.example`;
    const name = `Lena of the ${size}`;
    await invite(owner, size, email);
    await owner.visitor.sees(`A letter is on its way to ${email}.`);
    await owner.page.getByRole('list', { name: 'Invitations' }).getByText(email).waitFor();

    const guest = await visit(size);
    await guest.page.goto(await invitationTo(email));
    await guest.visitor.sees(/Mira Castellan invites you to .+, as viewer\./);
    expect(await axeFindings(guest.page)).toEqual([]);
    await guest.visitor.press('Make an account');
    await guest.visitor.fill('Name', name);
    expect(await guest.page.getByLabel('E-mail', { exact: true }).inputValue()).toBe(email);
    await guest.visitor.fill('Password', 'a-long-and-dry-password');
    await guest.visitor.press('Make the account');
    await guest.visitor.press('Join the project');
    await guest.visitor.sees('Where it stands');
    const place = new URL(guest.page.url()).pathname;

    await owner.page.reload();
    await owner.page.getByRole('button', { name: `Role of ${name}, viewer` }).click();
    await owner.page.getByRole('menuitem', { name: /^editor/ }).click();
    await owner.page.getByRole('button', { name: `Role of ${name}, editor` }).waitFor();
    expect(((await (await guest.page.request.get(`${server.url}/api${place}`)).json()) as { role: string }).role).toBe('editor');

    if (size === 'phone') {
      await owner.page.getByRole('button', { name: `Role of ${name}, editor` }).click();
      await owner.page.getByRole('menuitem', { name: /^Take out/ }).click();
    } else await owner.visitor.press(`Take ${name} out`);
    await owner.page.getByRole('dialog').getByRole('button', { name: 'Take out' }).click();
    await owner.page.getByRole('button', { name: `Role of ${name}, editor` }).waitFor({ state: 'detached' });
    await owner.visitor.sees(`${name} is no longer a member.`);
    expect((await guest.page.request.get(`${server.url}/api${place}`)).status()).toBe(404);
    await guest.page.reload();
    await guest.visitor.sees('No such project, or it is not yours to see.');
    expect(owner.complaints.filter((text) => !/422|409/.test(text))).toEqual([]);
    await Promise.all([owner.context.close(), guest.context.close()]);
  }, 240_000);
});

describe('a mailed invitation', () => {
  it('says to another account whom it is for, and nothing once it is taken back', async () => {
    const owner = await openMembers('wide');
    const email = 'ines@kerb.example';
    await invite(owner, 'wide', email);
    await owner.visitor.sees(`A letter is on its way to ${email}.`);
    const link = await invitationTo(email);

    const other = await visit('phone');
    await other.visitor.isSignedInAs(reviewer);
    await other.page.goto(link);
    await other.visitor.sees(`This invitation is for ${email}.`);
    expect(await other.page.getByRole('button', { name: 'Join the project' }).count()).toBe(0);

    await owner.visitor.press(`Take the invitation of ${email} back`);
    await owner.page.getByRole('list', { name: 'Invitations' }).getByText(email).waitFor({ state: 'detached' });
    await other.page.reload();
    await other.visitor.sees('This invitation has ended, was taken back, or was used before.');
    await Promise.all([owner.context.close(), other.context.close()]);
  });
});

it('shows everyone who may do what, and lets the reader leave', async () => {
  const { page, context, visitor } = await visit('phone');
  await visitor.isSignedInAs(reviewer);
  await visitor.open(`/projects/${await visitor.firstProjectId()}/members`);
  await visitor.sees('Who may do what');
  expect(await page.getByRole('button', { name: /^Role of|Invite/ }).count()).toBe(0);
  await visitor.press('Leave the project');
  await page.getByRole('dialog').getByRole('button', { name: 'Leave', exact: true }).click();
  await page.waitForURL(`${server.url}/`);
  await visitor.sees('Pit-lane limiter');
  expect(await page.getByText('Wet-track speed hold').count()).toBe(0);
  await context.close();
});
