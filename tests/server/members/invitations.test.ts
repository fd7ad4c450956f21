import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Project } from '@/contract';
import { rateLimit, user } from '@/db/tables';
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
