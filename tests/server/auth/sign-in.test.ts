import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createClient } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

/** The same person at another device. */
const elsewhere = (name: string) => createClient(app.url, name);

describe('sign-up', () => {
  it('signs in, with a team of one’s own and the default preferences', async () => {
    const ada = await app.client('Ada').signUp();
    const { status, body } = await ada.call('GET', '/api/me');
    expect(status).toBe(200);
    expect(body).toMatchObject({
      name: 'Ada',
      email: 'ada@team.example',
      emailVerified: false,
      teams: [{ name: 'Ada’s team', role: 'owner' }],
      preferences: { frequencyUnit: 'rad/s', magnitudeUnit: 'dB', theme: 'system' },
    });
  });

  it('keeps the session in a cookie that no script can read and no other site can use', async () => {
    const { headers } = await elsewhere('Bo').call('POST', '/api/auth/sign-up/email', {
      name: 'Bo',
      email: 'bo@team.example',
      password: 'long-enough-for-bo',
    });
    const [cookie] = headers.getSetCookie();
    expect(cookie).toMatch(/^kerbline\.session_token=/);
    expect(cookie).toMatch(/; HttpOnly/i);
    expect(cookie).toMatch(/; SameSite=Lax/i);
    expect(cookie).not.toMatch(/; Secure/i);
  });

  it.each([
    ['a weak password', { name: 'Cy', email: 'cy@team.example', password: 'short' }, 422, '/password'],
    ['what is no address', { name: 'Cy', email: 'cy', password: 'long-enough-for-cy' }, 422, '/email'],
    [
      'an address that has an account, whatever its case',
      { name: 'Ada', email: 'ADA@team.example', password: 'long-enough-for-ada' },
      422,
      '/email',
    ],
    ['a missing name', { email: 'cy@team.example', password: 'long-enough-for-cy' }, 400, '/name'],
    [
      'a field nobody asked for',
      { name: 'Cy', email: 'cy@team.example', password: 'long-enough-for-cy', emailVerified: true },
      400,
      '/emailVerified',
    ],
  ])('refuses %s and points at it', async (_what, body, status, pointer) => {
    const reply = await elsewhere('Cy').call('POST', '/api/auth/sign-up/email', body);
    expect(reply.status).toBe(status);
    expect(reply.headers.get('content-type')).toContain('application/problem+json');
    expect(reply.body).toMatchObject({ type: 'about:blank', status, errors: [{ pointer }] });
    expect(reply.headers.getSetCookie()).toEqual([]);
  });
});

describe('sign-in', () => {
  it('says the same of a wrong password and of an unknown address', async () => {
    const wrong = { status: 401, detail: 'That e-mail and password do not match.' };
    const ada = await elsewhere('Ada').call('POST', '/api/auth/sign-in/email', { email: 'ada@team.example', password: 'not her password' });
    const nobody = await elsewhere('No').call('POST', '/api/auth/sign-in/email', {
      email: 'no@team.example',
      password: 'not her password',
    });
    expect(ada.body).toMatchObject(wrong);
    expect(nobody.body).toMatchObject(wrong);
  });

  it('ends with sign-out, for the server as for the browser', async () => {
    const ada = await elsewhere('Ada').signIn();
    const stolen = ada.cookie;
    expect((await ada.call('POST', '/api/auth/sign-out', {})).status).toBe(204);
    expect((await ada.call('GET', '/api/me')).status).toBe(401);
    const thief = elsewhere('Ada');
    thief.cookie = stolen;
    expect((await thief.call('GET', '/api/me')).status).toBe(401);
  });

  it('takes no forged cookie', async () => {
    const ada = await elsewhere('Ada').signIn();
    ada.cookie = ada.cookie.replace(/token=(.)/, (_, first: string) => `token=${first === 'a' ? 'b' : 'a'}`);
    expect((await ada.call('GET', '/api/me')).status).toBe(401);
  });
});

describe('a secure site', () => {
  it('sends its cookie over https only', async () => {
    const secure = await startTestApp({ env: { BASE_URL: 'https://kerbline.example' } });
    const { headers } = await createClient(secure.url, 'Di').call(
      'POST',
      '/api/auth/sign-up/email',
      { name: 'Di', email: 'di@team.example', password: 'long-enough-for-di' },
      { origin: 'https://kerbline.example' },
    );
    expect(headers.getSetCookie()[0]).toMatch(/^__Secure-kerbline\.session_token=.*; Secure/i);
    await secure.close();
  });
});
