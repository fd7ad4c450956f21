import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DeviceSession, Me } from '@/contract';
import { createClient } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

describe('one’s account', () => {
  it('keeps a new name and lays new preferences over the old', async () => {
    const ada = await app.client('Ada').signUp();
    await ada.call('PATCH', '/api/me', { preferences: { theme: 'dark' } });
    await ada.call('PATCH', '/api/me', { name: 'Ada L.', preferences: { frequencyUnit: 'Hz' } });
    const { body } = await ada.call<Me>('GET', '/api/me');
    expect(body.name).toBe('Ada L.');
    expect(body.preferences).toMatchObject({ theme: 'dark', frequencyUnit: 'Hz', magnitudeUnit: 'dB' });
  });

  it.each([
    ['a unit nobody knows', { preferences: { frequencyUnit: 'rpm' } }, 422, '/preferences/frequencyUnit'],
    ['a preference nobody knows', { preferences: { font: 'big' } }, 400, '/preferences/font'],
    ['a number for a name', { name: 7 }, 400, '/name'],
    ['an empty name', { name: '  ' }, 422, '/name'],
    ['its address, which is not changed here', { email: 'other@team.example' }, 400, '/email'],
  ])('refuses %s', async (_what, body, status, pointer) => {
    const reply = await app.client('Ada').call('PATCH', '/api/me', body);
    expect(reply.status).toBe(status);
    expect(reply.body).toMatchObject({ errors: [{ pointer }] });
  });
});

describe('one’s sessions', () => {
  const devices = async (name: string) => (await app.client(name).call<{ items: DeviceSession[] }>('GET', '/api/me/sessions')).body.items;

  it('are listed with device and address, without the token, and can be ended one by one', async () => {
    const bo = await app.client('Bo').signUp();
    const phone = createClient(app.url, 'Bo');
    const agent = 'Mozilla/5.0 (Android 15; Mobile; rv:140.0) Gecko/140.0 Firefox/140.0';
    await phone.call('POST', '/api/auth/sign-in/email', { email: bo.email, password: bo.password }, { 'user-agent': agent });
    const listed = await devices('Bo');
    expect(listed).toHaveLength(2);
    const other = listed.find(({ current }) => !current);
    expect(other).toMatchObject({ device: 'Firefox on Android', address: '127.0.0.1' });
    expect(JSON.stringify(listed)).not.toContain('token');
    expect((await bo.call('DELETE', `/api/me/sessions/${other?.id}`)).status).toBe(204);
    expect((await phone.call('GET', '/api/me')).status).toBe(401);
    expect(await devices('Bo')).toHaveLength(1);
  });

  it('of somebody else are not there', async () => {
    await app.client('Cy').signUp();
    const [session] = await devices('Cy');
    expect((await app.client('Bo').call('DELETE', `/api/me/sessions/${session.id}`)).status).toBe(404);
    expect(await devices('Cy')).toHaveLength(1);
  });

  it('end all but this one', async () => {
    const di = await app.client('Di').signUp();
    const phone = await createClient(app.url, 'Di').signIn();
    expect((await di.call('POST', '/api/me/sessions/revoke-others')).status).toBe(204);
    expect((await phone.call('GET', '/api/me')).status).toBe(401);
    expect((await di.call('GET', '/api/me')).status).toBe(200);
  });
});
