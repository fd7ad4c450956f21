import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { engineVersion } from '@/analysis';
import { routes } from '@/server/routes';
import { isLoopback } from '@/server/system/loopback';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

describe('health', () => {
  it('is told without sign-in', async () => {
    const { status, body } = await app.client('anyone').call('GET', '/api/health');
    expect(status).toBe(200);
    expect(body).toEqual({ status: 'ok', engineVersion, database: 'ok' });
  });

  it('is 503 where the database does not hold what it must', async () => {
    const broken = await startTestApp();
    broken.db.run('pragma synchronous = normal');
    expect((await broken.client('anyone').call('GET', '/api/health')).body).toMatchObject({ status: 503 });
    await broken.close();
  });
});

describe('the OpenAPI document', () => {
  interface Operation {
    operationId: string;
    responses: Record<string, { content?: Record<string, unknown> }>;
    parameters?: { name: string; in: string }[];
  }
  interface Document {
    openapi: string;
    paths: Record<string, Record<string, Operation>>;
    components: { schemas: Record<string, unknown> };
  }
  const read = async () => (await app.client('anyone').call<Document>('GET', '/api/openapi.json')).body;

  it('has every route, with its parameters, its answer and its refusals', async () => {
    const document = await read();
    expect(document.openapi).toBe('3.1.0');
    for (const { method, path, status, output, events } of routes) {
      const operation = document.paths[path.replace(/:(\w+)/g, '{$1}')]?.[method];
      expect(operation, `${method} ${path}`).toBeDefined();
      const named = operation.parameters?.filter((parameter) => parameter.in === 'path').map(({ name }) => name) ?? [];
      expect(named, `${method} ${path}`).toEqual([...path.matchAll(/:(\w+)/g)].map(([, name]) => name));
      expect(Object.keys(operation.responses)).toEqual(expect.arrayContaining([String(status), 'default']));
      if (output && status < 300)
        expect(operation.responses[status].content).toHaveProperty(events ? 'text/event-stream' : 'application/json');
    }
  });

  it('names every operation once and refers to nothing that is missing', async () => {
    const document = await read();
    const ids = Object.values(document.paths).flatMap((path) => Object.values(path).map(({ operationId }) => operationId));
    expect(new Set(ids).size).toBe(ids.length);
    const references = [...JSON.stringify(document).matchAll(/"#\/components\/schemas\/([^"]+)"/g)].map(([, name]) => name);
    expect(references.length).toBeGreaterThan(10);
    expect(references.filter((name) => !(name in document.components.schemas))).toEqual([]);
  });

  it('has a readable page made of our own files alone', async () => {
    const page = await (await fetch(`${app.url}/api/docs`)).text();
    const files = [...page.matchAll(/(?:src|href)="([^"]+)"/g)].map(([, file]) => file);
    expect(files).toHaveLength(3);
    for (const file of files) expect((await fetch(`${app.url}${file}`)).status, file).toBe(200);
  });
});

describe('the local mail fake', () => {
  const status = async (from: TestApp) => (await from.client('anyone').call('GET', '/api/dev/mail')).status;

  it('is read newest first', async () => {
    const ada = await app.client('Ada').signUp();
    await ada.call('POST', '/api/auth/request-password-reset', { email: ada.email });
    const { body } = await app.client('anyone').call<{ items: { subject: string }[] }>('GET', `/api/dev/mail?to=${ada.email}`);
    expect(body.items.map(({ subject }) => subject)).toEqual(['Choose a new password for Kerbline', 'Confirm your address for Kerbline']);
  });

  it('is not there in production, with a mail server, or for anyone beyond this machine', async () => {
    const production = await startTestApp({ env: { NODE_ENV: 'production' } });
    const sending = await startTestApp({ env: { SMTP_URL: 'smtp://127.0.0.1:9' } });
    expect([await status(app), await status(production), await status(sending)]).toEqual([200, 404, 404]);
    const through = await fetch(`${app.url}/api/dev/mail`, { headers: { 'x-forwarded-for': '203.0.113.7' } });
    expect(through.status).toBe(404);
    await production.close();
    await sending.close();
  });

  it.each([
    ['127.0.0.1', '127.0.0.1', true],
    ['::1', '::1', true],
    ['::ffff:127.0.0.1', '::ffff:127.0.0.1', true],
    ['203.0.113.7', '127.0.0.1', false],
    ['127.0.0.1', '203.0.113.7', false],
    ['127.evil', '203.0.113.7', false],
    [undefined, undefined, false],
  ])('a caller %s over %s is loopback: %s', (ip, remoteAddress, expected) => {
    expect(isLoopback({ ip, socket: { remoteAddress } })).toBe(expected);
  });
});
