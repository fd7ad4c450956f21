import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '../support/test-app';

let app: TestApp;
let bare: TestApp;
const clientDir = mkdtempSync(join(tmpdir(), 'kerbline-client-'));

beforeAll(async () => {
  mkdirSync(join(clientDir, '_expo'));
  writeFileSync(join(clientDir, 'index.html'), '<!doctype html><title>The client</title>');
  writeFileSync(join(clientDir, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  writeFileSync(join(clientDir, '_expo', 'entry-1a2b.js'), `"use strict";${'/* padding */'.repeat(200)}`);
  app = await startTestApp({ config: { clientDir } });
  bare = await startTestApp();
});
afterAll(async () => {
  await app.close();
  await bare.close();
  rmSync(clientDir, { recursive: true });
});

const get = (path: string, headers: Record<string, string> = {}) => fetch(`${app.url}${path}`, { headers });

describe('the client', () => {
  it('is one page at every address that is its own, asked for anew each time', async () => {
    for (const path of ['/', '/projects/7/bench', '/reset-password?token=x']) {
      const answer = await get(path);
      expect(answer.status).toBe(200);
      expect(answer.headers.get('cache-control')).toBe('no-cache');
      expect(await answer.text()).toContain('The client');
    }
  });

  it('has files named by their content, kept for a year and sent compressed', async () => {
    const answer = await get('/_expo/entry-1a2b.js', { 'accept-encoding': 'gzip' });
    expect(answer.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    expect(answer.headers.get('content-encoding')).toBe('gzip');
    expect((await get('/icon.svg')).headers.get('cache-control')).toBe('no-cache');
  });

  it('is not handed out in place of a script that is gone', async () => {
    expect((await get('/_expo/entry-0000.js')).status).toBe(404);
  });

  it('stays inside its folder', async () => {
    expect(await (await get('/..%2f..%2fetc/passwd')).text()).not.toContain('root:');
  });

  it('that is not built says what to do, with 503', async () => {
    const answer = await fetch(`${bare.url}/`);
    expect(answer.status).toBe(503);
    expect(await answer.text()).toContain('npm start');
    expect((await fetch(`${bare.url}/api/health`)).status).toBe(200);
  });
});

describe('every answer', () => {
  it.each(['/', '/api/health', '/api/nothing', '/api/docs'])('carries the content security policy: %s', async (path) => {
    const { headers } = await get(path);
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy.split(';').sort()).toEqual(
      [
        "default-src 'none'",
        "script-src 'self'",
        "style-src 'self' 'unsafe-inline'",
        "style-src-attr 'none'",
        "img-src 'self' data: blob:",
        "font-src 'self'",
        "connect-src 'self'",
        "manifest-src 'self'",
        "worker-src 'self'",
        "base-uri 'none'",
        "form-action 'self'",
        "frame-ancestors 'none'",
      ].sort(),
    );
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('x-powered-by')).toBeNull();
  });

  it('of the API is kept by nobody', async () => {
    expect((await get('/api/health')).headers.get('cache-control')).toBe('no-store');
  });
});
