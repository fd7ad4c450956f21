import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AcceptedInvitation, Activity, Invitation, OpenedInvitation, Project } from '@/contract';
import { projectInvitation, rateLimit, user } from '@/db/tables';
import { made } from '../../support/a-project';
import type { Client } from '../../support/client';
import { mailedLink, newestMail } from '../../support/mail';
import { addTo, confirmAddress, invitationsAt, invite, membersAt, verified } from '../../support/members';
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

describe('an invitation', () => {
  it('makes a member at once of whoever has an account with this address, confirmed', async () => {
    const bo = await verified(app, 'bo');
    expect((await invite(ada, at, bo, 'reviewer')).status).toBe(201);
    expect((await bo.call<Project>('GET', at)).body.role).toBe('reviewer');
    expect(await invitationsAt(ada, at)).toEqual([]);
    const { subject, links } = await newestMail(app, bo.email);
    expect(subject).toContain('ada has made you reviewer of Wet <b>hold</b>');
    expect(links).toEqual([expect.stringMatching(/\/projects\/[0-9a-f-]{36}$/)]);
  });

  it('sent before the sign-up waits until the address is confirmed, then counts by itself', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'editor');
    await guest.signUp();
    expect(await seesProject(guest)).toBe(false);
    expect(await invitationsAt(ada, at)).toHaveLength(1);
    await confirmAddress(app, guest);
    expect((await guest.call<Project>('GET', at)).body.role).toBe('editor');
    expect(await invitationsAt(ada, at)).toEqual([]);
  });

  it('sent to an account with an unconfirmed address waits in the same way', async () => {
    const guest = await newcomer().signUp();
    const confirmation = await mailedLink(app, guest.email);
    await invite(ada, at, guest, 'viewer');
    expect(await seesProject(guest)).toBe(false);
    await guest.call('GET', confirmation.pathname + confirmation.search);
    expect(await seesProject(guest)).toBe(true);
  });

  it('counts with the next sign-in where the server stopped between confirming and joining', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'viewer');
    await guest.signUp();
    app.db.update(user).set({ emailVerified: true }).where(eq(user.email, guest.email)).run();
    expect(await seesProject(guest)).toBe(false);
    await guest.signIn();
    expect(await seesProject(guest)).toBe(true);
  });

  it('is answered and listed alike with an account, without one, and with an unconfirmed one', async () => {
    const people = [await verified(app, 'cy'), newcomer(), await newcomer().signUp()];
    const replies = await Promise.all(people.map((person) => invite(ada, at, person, 'viewer')));
    for (const [index, { status, body }] of replies.entries()) {
      expect(status).toBe(201);
      expect(body).toEqual({
        id: expect.stringMatching(/^[0-9a-f-]{36}$/),
        email: people[index].email,
        role: 'viewer',
        invitedBy: 'ada',
        sentAt: expect.any(String),
        expiresAt: expect.any(String),
      });
    }
  });

  it('goes to an address however it is written, once', async () => {
    const guest = newcomer();
    await invite(ada, at, { email: guest.email.toUpperCase() }, 'viewer');
    expect(await invite(ada, at, guest, 'editor')).toMatchObject({ status: 409, body: { errors: [{ pointer: '/email' }] } });
    await guest.signUp();
    await confirmAddress(app, guest);
    expect(await seesProject(guest)).toBe(true);
    expect(await invite(ada, at, guest, 'editor')).toMatchObject({ status: 409, body: { errors: [{ pointer: '/email' }] } });
    expect((await membersAt(ada, at)).map(({ role }) => role)).toEqual(['owner', 'viewer']);
  });

  it('gives no ownership, and takes no address that is none', async () => {
    expect((await invite(ada, at, newcomer(), 'owner')).status).toBe(422);
    expect((await invite(ada, at, { email: 'not an address' }, 'viewer')).status).toBe(422);
    expect((await ada.call('POST', `${at}/members`, { email: 'a@b.example', role: 'viewer', createdAt: 0 })).status).toBe(400);
    expect(await invitationsAt(ada, at)).toEqual([]);
  });

  it('says in its letter who invites to what, as text', async () => {
    const guest = newcomer();
    await invite(ada, at, guest, 'reviewer');
    const { text, html, links } = await newestMail(app, guest.email);
    expect(text).toContain('ada invites you to the project “Wet <b>hold</b>” in Kerbline, as reviewer.');
    expect(html).toContain('Wet &lt;b&gt;hold&lt;/b&gt;');
    expect(links).toHaveLength(1);
  });

  it('is known, listed and taken back by owners alone', async () => {
    const dee = await verified(app, 'dee');
    await addTo(ada, at, dee, 'editor');
    const { body } = await invite(ada, at, newcomer(), 'viewer');
    for (const [method, path] of [
      ['POST', `${at}/members`],
      ['GET', `${at}/invitations`],
      ['POST', `${at}/invitations/${body.id}/resend`],
      ['DELETE', `${at}/invitations/${body.id}`],
    ])
      expect((await dee.call(method, path, method === 'POST' ? { email: 'x@y.example', role: 'viewer' } : undefined)).status).toBe(403);
    expect(await invitationsAt(ada, at)).toMatchObject([{ id: body.id, role: 'viewer', invitedBy: 'ada' }]);
  });

  it('of another project is not there', async () => {
    const { body } = await invite(ada, at, newcomer(), 'viewer');
    const other = `/api/projects/${(await made<Project>(ada, '/api/projects', { name: 'Other' })).id}`;
    expect((await ada.call('DELETE', `${other}/invitations/${body.id}`)).status).toBe(404);
    expect((await ada.call('POST', `${other}/invitations/${body.id}/resend`)).status).toBe(404);
    expect(await invitationsAt(ada, at)).toHaveLength(1);
  });
});

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

describe('invitations', () => {
  it('end at a limit per sender, and per address whoever sends', async () => {
    const guest = newcomer();
    const { body } = await invite(ada, at, guest, 'viewer');
    for (let i = 0; i < 4; i += 1) expect((await ada.call('POST', `${at}/invitations/${body.id}/resend`)).status).toBe(200);
    const refused = await ada.call('POST', `${at}/invitations/${body.id}/resend`);
    expect(refused.status).toBe(429);
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0);
    app.db.update(rateLimit).set({ count: 60 }).run();
    expect((await invite(ada, at, newcomer(), 'viewer')).status).toBe(429);
  });

  it('are sent once per Idempotency-Key', async () => {
    const guest = newcomer();
    const call = () => ada.call('POST', `${at}/members`, { email: guest.email, role: 'viewer' }, { 'idempotency-key': 'ask-once' });
    const [first, second] = [await call(), await call()];
    expect(second).toMatchObject({ status: 201, body: first.body });
    const { body } = await app.client('anyone').call<{ items: unknown[] }>('GET', `/api/dev/mail?to=${guest.email}`);
    expect(body.items).toHaveLength(1);
  });
});
