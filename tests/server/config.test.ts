import { mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { readConfig } from '@/server/config';

const DATA_DIR = mkdtempSync(join(tmpdir(), 'kerbline-config-'));
afterAll(() => rmSync(DATA_DIR, { recursive: true }));
const read = (environment: Record<string, string> = {}) => readConfig({ DATA_DIR, ...environment });

describe('the configuration', () => {
  it('has defaults for everything', () => {
    expect(read()).toMatchObject({
      port: 3000,
      host: '127.0.0.1',
      baseUrl: 'http://127.0.0.1:3000',
      production: false,
      demo: true,
      smtpUrl: null,
      analysePerMinute: 600,
      answerWithinMs: 2_000,
      logLevel: 'info',
    });
  });

  it.each([
    [{ DEMO: '0' }, false],
    [{ DEMO: '1', NODE_ENV: 'production' }, true],
    [{ NODE_ENV: 'production' }, false],
    [{ NODE_ENV: '' }, true],
  ])('with %o has demo data: %s', (environment, demo) => {
    expect(read(environment as Record<string, string>).demo).toBe(demo);
  });

  it('takes an empty variable for an absent one, and no slash at the end of the public address', () => {
    expect(read({ PORT: '', SMTP_URL: '', BASE_URL: 'https://kerbline.example/' })).toMatchObject({
      port: 3000,
      smtpUrl: null,
      baseUrl: 'https://kerbline.example',
    });
  });

  it('names every variable that is wrong', () => {
    const wrong = () => read({ PORT: 'eighty', BASE_URL: 'kerbline.example', DEMO: 'maybe', SMTP_URL: 'http://mail' });
    expect(wrong).toThrow(/PORT:[^]*BASE_URL:[^]*DEMO:[^]*SMTP_URL:/);
  });

  it('makes a secret once, for its owner’s eyes', () => {
    const { secret } = read();
    expect(secret.length).toBeGreaterThanOrEqual(43);
    expect(read().secret).toBe(secret);
    expect(readFileSync(join(DATA_DIR, 'secret'), 'utf8')).toBe(secret);
    expect(statSync(join(DATA_DIR, 'secret')).mode & 0o777).toBe(0o600);
  });
});
