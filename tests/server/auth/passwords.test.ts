import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createClient } from '../../support/client';
import { mailedLink } from '../../support/mail';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

const tokenIn = (link: URL) => link.searchParams.get('token');

describe('a forgotten password', () => {
  it('is replaced by the mailed token, once, and every session ends', async () => {
    const ada = await app.client('Ada').signUp();
    const stranger = createClient(app.url, 'Stranger');
    expect(
      (await stranger.call('POST', '/api/auth/request-password-reset', { email: ada.email, redirectTo: '/reset-password' })).status,
    ).toBe(204);
    const link = await mailedLink(app, ada.email);
    expect(link.pathname).toBe('/reset-password');

    const choice = { token: tokenIn(link), newPassword: 'an-altogether-new-one' };
    expect((await stranger.call('POST', '/api/auth/reset-password', choice)).status).toBe(204);
    expect((await ada.call('GET', '/api/me')).status).toBe(401);
    await expect(createClient(app.url, 'Ada').signIn(ada.password)).rejects.toThrow('401');
    await createClient(app.url, 'Ada').signIn('an-altogether-new-one');

    const again = await stranger.call('POST', '/api/auth/reset-password', { ...choice, newPassword: 'a-thief-chooses-this' });
    expect(again.status).toBe(422);
    expect(again.body).toMatchObject({ errors: [{ pointer: '/token' }] });
  });

  it('tells nobody whether an address is known, and mails an unknown one nothing', async () => {
    const reply = await createClient(app.url, 'x').call('POST', '/api/auth/request-password-reset', { email: 'unknown@team.example' });
    expect(reply.status).toBe(204);
    const mails = await app.client('x').call<{ items: unknown[] }>('GET', '/api/dev/mail?to=unknown@team.example');
    expect(mails.body.items).toEqual([]);
  });

  it('is not replaced by a weak one, and the token is then still good', async () => {
    const bo = await app.client('Bo').signUp();
    await bo.call('POST', '/api/auth/request-password-reset', { email: bo.email });
    const token = tokenIn(await mailedLink(app, bo.email));
    const weak = await bo.call('POST', '/api/auth/reset-password', { token, newPassword: 'short' });
    expect(weak.status).toBe(422);
    expect(weak.body).toMatchObject({ errors: [{ pointer: '/newPassword' }] });
    expect((await bo.call('POST', '/api/auth/reset-password', { token, newPassword: 'long-enough-this-time' })).status).toBe(204);
  });
});

describe('a changed password', () => {
  it('ends every other session and keeps this one', async () => {
    const cy = await app.client('Cy').signUp();
    const phone = await createClient(app.url, 'Cy').signIn();
    const change = { currentPassword: cy.password, newPassword: 'what-cy-chose-next' };
    expect((await cy.call('POST', '/api/auth/change-password', change)).status).toBe(204);
    expect((await cy.call('GET', '/api/me')).status).toBe(200);
    expect((await phone.call('GET', '/api/me')).status).toBe(401);
  });

  it('needs the one of now', async () => {
    const di = await app.client('Di').signUp();
    const reply = await di.call('POST', '/api/auth/change-password', { currentPassword: 'a guess', newPassword: 'what-di-chose-next' });
    expect(reply.status).toBe(422);
    expect(reply.body).toMatchObject({ errors: [{ pointer: '/currentPassword' }] });
  });

  it('needs somebody signed in', async () => {
    const change = { currentPassword: 'what it was', newPassword: 'what-is-to-be' };
    expect((await createClient(app.url, 'No').call('POST', '/api/auth/change-password', change)).status).toBe(401);
  });
});
