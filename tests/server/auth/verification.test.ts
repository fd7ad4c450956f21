import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createClient } from '../../support/client';
import { mailedLink, newestMail } from '../../support/mail';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

const isVerified = async (name: string) => (await app.client(name).call('GET', '/api/me')).body.emailVerified;

describe('a mailed verification', () => {
  it('confirms the address at whatever device the link is opened, and leads to a page that needs no sign-in', async () => {
    const ada = await app.client('Ada').signUp();
    expect(await isVerified('Ada')).toBe(false);
    const link = await mailedLink(app, ada.email);
    const phone = createClient(app.url, 'phone');
    const { status, headers } = await phone.call('GET', link.pathname + link.search);
    expect(status).toBe(302);
    expect(headers.get('location')).toBe('/verified');
    expect(await isVerified('Ada')).toBe(true);
    expect((await phone.call('GET', '/api/me')).status).toBe(401);
  });

  it('is sent again when asked for, to one’s own address alone', async () => {
    const bo = await app.client('Bo').signUp();
    const asked = await bo.call('POST', '/api/auth/send-verification-email', { email: bo.email, callbackURL: '/projects' });
    expect(asked.status).toBe(204);
    const link = await mailedLink(app, bo.email);
    expect((await bo.call('GET', link.pathname + link.search)).headers.get('location')).toBe('/projects');
    const other = await bo.call('POST', '/api/auth/send-verification-email', { email: 'ada@team.example' });
    expect(other.status).toBe(422);
    expect((await bo.call('POST', '/api/auth/send-verification-email', { email: bo.email })).status).toBe(409);
  });

  it('says so on the page where the token is no good', async () => {
    const { status, headers } = await app.client('Cy').call('GET', '/api/auth/verify-email?token=nonsense');
    expect(status).toBe(302);
    expect(headers.get('location')).toBe('/verified?error=link');
  });

  it.each(['https://evil.example/', '//evil.example/', '/\\evil.example'])('leads nowhere else: %s', async (callbackURL) => {
    const path = `/api/auth/verify-email?token=nonsense&callbackURL=${encodeURIComponent(callbackURL)}`;
    expect((await app.client('Cy').call('GET', path)).status).toBe(422);
  });

  it('greets people by names that stay text', async () => {
    const email = 'dee@team.example';
    const name = '<img src=x onerror=alert(1)>';
    await createClient(app.url, 'Dee').call('POST', '/api/auth/sign-up/email', { name, email, password: 'long-enough-for-dee' });
    const { html, text } = await newestMail(app, email);
    expect(text).toContain(name);
    expect(html).toContain('&lt;img src=x onerror=alert(1)&gt;');
    expect(html).not.toContain('<img');
  });
});
