import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { startTestApp, type TestApp } from '../../support/test-app';

const received: { from: string; to: string[]; source: string }[] = [];
const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  onData: (stream, { envelope }, done) => {
    let source = '';
    stream.on('data', (chunk: Buffer) => (source += chunk.toString()));
    stream.on('end', () => {
      received.push({
        from: envelope.mailFrom ? envelope.mailFrom.address : '',
        to: envelope.rcptTo.map(({ address }) => address),
        source,
      });
      done();
    });
  },
});

let app: TestApp;
beforeAll(async () => {
  await new Promise<void>((resolve) => smtp.listen(0, '127.0.0.1', resolve));
  const { port } = smtp.server.address() as AddressInfo;
  app = await startTestApp({ env: { SMTP_URL: `smtp://127.0.0.1:${port}`, BASE_URL: 'http://kerbline.example' } });
});
afterAll(async () => {
  await app.close();
  await new Promise<void>((resolve) => smtp.close(resolve));
});

describe('with a mail server', () => {
  it('a sign-up’s letter goes out as text and HTML, with a link to the public address', async () => {
    await app.client('Ada').signUp();
    await vi.waitFor(() => expect(received).toHaveLength(1), 5_000);
    const [{ from, to, source }] = received;
    expect(from).toBe('no-reply@kerbline.example');
    expect(to).toEqual(['ada@team.example']);
    expect(source).toContain('Content-Type: text/plain');
    expect(source).toContain('Content-Type: text/html');
    expect(source.replace(/=\r\n/g, '')).toContain('http://kerbline.example/api/auth/verify-email?token=');
  });
});

describe('with a mail server that does not answer', () => {
  it('a sign-up still succeeds', async () => {
    const silent = await startTestApp({ env: { SMTP_URL: 'smtp://127.0.0.1:9' } });
    const ada = await silent.client('Ada').signUp();
    expect((await ada.call('GET', '/api/me')).status).toBe(200);
    await silent.close();
  });
});
