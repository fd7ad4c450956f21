import { mkdtempSync, rmSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Database } from '@/db/open';
import { createApp } from '@/server/app';
import { readConfig, type Config } from '@/server/config';
import { createContext, type Context } from '@/server/context';
import type { Route } from '@/server/http/route';
import { createClient, type Client } from './client';

/** The whole server on a port and a data directory of its own. */
export interface TestApp {
  readonly url: string;
  readonly context: Context;
  readonly db: Database;
  /** Someone who has not signed up yet; the same name is the same person. */
  readonly client: (name: string) => Client;
  readonly close: () => Promise<void>;
}

export interface TestAppOptions {
  /** Environment variables beside DATA_DIR, as a person starting the server would set them. */
  readonly env?: Readonly<Record<string, string>>;
  readonly config?: Partial<Config>;
  /** Instead of the product's own routes. */
  readonly routes?: readonly Route[];
  readonly replaced?: Partial<Pick<Context, 'jobs' | 'mailer' | 'log'>>;
}

const listening = (server: Server) =>
  new Promise<number>((resolve) => server.listen(0, '127.0.0.1', () => resolve((server.address() as AddressInfo).port)));

/** @example const app = await startTestApp(); const ada = await app.client('ada').signUp(); */
export async function startTestApp({ env, config, routes, replaced }: TestAppOptions = {}): Promise<TestApp> {
  const dataDir = mkdtempSync(join(tmpdir(), 'kerbline-test-'));
  const settings = {
    ...readConfig({ LOG_LEVEL: 'silent', CHECK_ANSWERS: '1', ANSWER_WITHIN_MS: '60000', ...env, DATA_DIR: dataDir }),
    ...config,
  };
  const context = createContext(settings, replaced);
  const server = createServer(createApp(context, routes));
  const url = `http://127.0.0.1:${await listening(server)}`;
  const cast = new Map<string, Client>();
  return {
    url,
    context,
    db: context.db,
    client: (name) => {
      const known = cast.get(name) ?? createClient(url, name);
      cast.set(name, known);
      return known;
    },
    close: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await context.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
