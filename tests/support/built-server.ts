import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A running product, as `npm start` makes it, on a data directory of its own. */
export interface BuiltServer {
  readonly url: string;
  readonly dataDir: string;
  /** Sends SIGTERM and answers the exit code. */
  readonly stop: () => Promise<number | null>;
}

/** What the test runner puts into the environment; a newcomer starts without it. */
const runnersOwn = ['NODE_ENV', 'BASE_URL', 'MODE', 'DEV', 'PROD', 'SSR'];

const START_TIMEOUT_MS = 240_000;

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.on('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject(new Error('no port'))));
    });
  });
}

/** Starts the built product; `demo` seeds the demo team. Throws with the log's end where it does not answer. */
export async function startBuiltServer({ demo = true } = {}): Promise<BuiltServer> {
  const port = await freePort();
  const dataDir = mkdtempSync(join(tmpdir(), 'kerbline-browser-'));
  const url = `http://127.0.0.1:${port}`;
  const env = { ...process.env, PORT: String(port), HOST: '127.0.0.1', DATA_DIR: dataDir, DEMO: demo ? '1' : '0' };
  for (const name of runnersOwn) Reflect.deleteProperty(env, name);
  const child = spawn(process.execPath, ['scripts/start.mjs'], {
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let log = '';
  child.stdout.on('data', (chunk: Buffer) => (log += chunk.toString()));
  child.stderr.on('data', (chunk: Buffer) => (log += chunk.toString()));
  const ended = new Promise<number | null>((resolve) => child.once('exit', resolve));

  const deadline = Date.now() + START_TIMEOUT_MS;
  while (Date.now() < deadline && child.exitCode === null) {
    const answer = await fetch(`${url}/api/health`).catch(() => null);
    if (answer?.ok) {
      return {
        url,
        dataDir,
        stop: async () => {
          child.kill('SIGTERM');
          const code = await ended;
          rmSync(dataDir, { recursive: true, force: true });
          return code;
        },
      };
    }
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  child.kill('SIGKILL');
  throw new Error(`The server did not answer ${url}/api/health:\n${log.slice(-2000)}`);
}
