import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AcceptedInvitation, Activity, Invitation, OpenedInvitation, Project } from '@/contract';
import { projectInvitation, rateLimit } from '@/db/tables';
import { made } from '../../support/a-project';
import type { Client } from '../../support/client';
import { mailedLink } from '../../support/mail';
import { confirmAddress, invitationsAt, invite } from '../../support/members';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let at: string;
let count = 0;
/** Someone nobody has heard of. */
const newcomer = () => app.client(`guest${(count += 1)}`);
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
beforeEach(async () => {
  app.db.delete(rateLimit).run();
  at = `/api/projects/${(await made<Project>(ada, '/api/projects', { name: 'Wet <b>hold</b>' })).id}`;
});
afterAll(() => app.close());

const seesProject = async (client: Client) => (await client.call('GET', at)).status === 200;
const tokenFor = async (email: string) => (await mailedLink(app, email)).searchParams.get('token')!;
const accept = (client: Client, token: string) => client.call<AcceptedInvitation>('POST', '/api/invitations/accept', { token });
const read = (token: string) => app.client('anyone').call<OpenedInvitation>('POST', '/api/invitations/read', { token });
const letExpire = (email: string) =>
  app.db
    .update(projectInvitation)
    .set({ expiresAt: new Date(Date.now() - 1) })
    .where(eq(projectInvitation.email, email))
    .run();

describe('an invitation’s link', () => {
  it('says what it is for, and joins once, confirming the address that it went to', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    expect((await read(token)).body).toMatchObject({ project: 'Wet <b>hold</b>', invitedBy: 'ada', email: guest.email, role: 'editor' });
    await guest.signUp();
    expect(await accept(guest, token)).toMatchObject({ status: 200, body: { projectId: at.split('/').at(-1), role: 'editor' } });
    expect(await seesProject(guest)).toBe(true);
    expect((await guest.call('GET', '/api/me')).body.emailVerified).toBe(true);
    expect((await accept(guest, token)).status).toBe(404);
    expect((await read(token)).status).toBe(404);
    const { body } = await ada.call<{ items: Activity[] }>('GET', `${at}/activity`);
    expect(body.items[0]).toMatchObject({ action: 'member.joined', by: guest.name, summary: 'joined as editor' });
  });

  it('lets nobody in whose account has another address', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    const thief = await newcomer().signUp();
    expect((await accept(thief, token)).status).toBe(403);
    expect(await seesProject(thief)).toBe(false);
    expect((await accept(app.client('nobody'), token)).status).toBe(401);
    await guest.signUp();
    expect((await accept(guest, token)).status).toBe(200);
  });

  it('of someone who joined by confirming the address is used up', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    await guest.signUp();
    await confirmAddress(app, guest);
    expect(await accept(guest, token)).toMatchObject({ status: 404, body: { detail: expect.stringContaining('in your list') } });
  });

  it('opens nothing once it has run out, nor does confirming the address', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    letExpire(guest.email);
    await guest.signUp();
    expect((await read(token)).status).toBe(404);
    expect((await accept(guest, token)).status).toBe(404);
    await confirmAddress(app, guest);
    expect(await seesProject(guest)).toBe(false);
  });

  it('sent again lives its full time again, and the old one is dead', async () => {
    const guest = newcomer();
    const { body: first } = await invite(ada, at, guest, 'editor');
    const old = await tokenFor(guest.email);
    letExpire(guest.email);
    const again = await ada.call<Invitation>('POST', `${at}/invitations/${first.id}/resend`);
    expect(again).toMatchObject({ status: 200, body: { id: first.id, email: guest.email, role: 'editor' } });
    expect(Date.parse(again.body.expiresAt)).toBeGreaterThan(Date.now() + 13 * 24 * 3600_000);
    await guest.signUp();
    expect((await accept(guest, old)).status).toBe(404);
  });

  it('is dead once the invitation was taken back, also for an address confirmed later', async () => {
    const guest = newcomer();
    const { body } = await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    expect((await ada.call('DELETE', `${at}/invitations/${body.id}`)).status).toBe(204);
    expect((await ada.call('DELETE', `${at}/invitations/${body.id}`)).status).toBe(404);
    await guest.signUp();
    expect((await accept(guest, token)).status).toBe(404);
    await confirmAddress(app, guest);
    expect(await seesProject(guest)).toBe(false);
  });

  it('is kept nowhere but in the mail', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    expect(JSON.stringify(app.db.select().from(projectInvitation).all())).not.toContain(token);
    expect((await invitationsAt(ada, at))[0]).not.toHaveProperty('tokenHash');
  });

  it('is used by one of two requests at once', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    const token = await tokenFor(guest.email);
    await guest.signUp();
    const statuses = (await Promise.all([accept(guest, token), accept(guest, token)])).map(({ status }) => status);
    expect(statuses.sort()).toEqual([200, 404]);
  });
});
