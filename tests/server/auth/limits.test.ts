import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { addressKey, attempt, limits } from '@/server/auth/limits';
import { createClient } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeEach(async () => {
  app = await startTestApp();
});
afterEach(() => app.close());

const times = <T>(count: number, make: (index: number) => T) => Array.from({ length: count }, (_, index) => make(index));

/** Signs in as someone who does not exist, one account per attempt. */
const tryStranger = (index: number) =>
  createClient(app.url, `s${index}`).call('POST', '/api/auth/sign-in/email', { email: `s${index}@team.example`, password: 'a guess' });

describe('sign-ins', () => {
  it('are refused past 30 a minute from one address, with the time to wait', async () => {
    const replies = await Promise.all(times(limits.signIn.most, tryStranger));
    expect(replies.map(({ status }) => status)).toEqual(times(30, () => 401));
    const { status, headers, body } = await tryStranger(31);
    expect(status).toBe(429);
    expect(Number(headers.get('retry-after'))).toBeGreaterThan(0);
    expect(Number(headers.get('retry-after'))).toBeLessThanOrEqual(60);
    expect(body).toMatchObject({ status: 429, title: 'Too Many Requests' });
  });

  it('that fail are refused past 10 for one account, then even with the right password, however many come at once', async () => {
    const ada = await app.client('Ada').signUp();
    const guess = () => createClient(app.url, 'x').call('POST', '/api/auth/sign-in/email', { email: ada.email, password: 'a guess' });
    const replies = await Promise.all(times(14, guess));
    const refused = replies.filter(({ status }) => status === 429);
    expect(refused).toHaveLength(4);
    await expect(createClient(app.url, 'Ada').signIn()).rejects.toThrow('429');
    expect((await ada.call('GET', '/api/me')).status).toBe(200);
  });

  it('that succeed do not count as failed', async () => {
    const bo = await app.client('Bo').signUp();
    for (const _ of times(12, () => null)) await createClient(app.url, 'Bo').signIn();
    expect((await bo.call('GET', '/api/me')).status).toBe(200);
  });
});

describe('limits', () => {
  it('are each address’s own, as a proxy on this machine names it', async () => {
    const from = (address: string) =>
      createClient(app.url, 'far').call(
        'POST',
        '/api/auth/sign-in/email',
        { email: 'far@team.example', password: 'a guess' },
        { 'x-forwarded-for': address },
      );
    times(limits.signIn.most, () => attempt(app.db, limits.signIn, addressKey('203.0.113.7')));
    expect((await from('203.0.113.7')).status).toBe(429);
    expect((await from('203.0.113.8')).status).toBe(401);
  });
});
