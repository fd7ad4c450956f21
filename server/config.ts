import { mkdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { z } from 'zod';
import { readSecret } from './secret';

export interface Config {
  readonly port: number;
  readonly host: string;
  readonly dataDir: string;
  /** The public address, without a slash at the end; links in mails begin with it. */
  readonly baseUrl: string;
  readonly production: boolean;
  /** Whether an empty database is filled with the demo team. */
  readonly demo: boolean;
  /** Null: mails are kept by the local fake. */
  readonly smtpUrl: string | null;
  readonly analysePerMinute: number;
  /** What is not computed by then is answered as a job, ms. */
  readonly answerWithinMs: number;
  readonly logLevel: string;
  /** Where the built client stands; null until it is built. */
  readonly clientDir: string | null;
  /** Whether every answer is held against its schema, as tests do. */
  readonly checkAnswers: boolean;
  /** Signs cookies and mailed links. */
  readonly secret: string;
}

const Environment = z.object({
  PORT: z.coerce.number().int().min(0).max(65535).default(3000),
  HOST: z.string().default('127.0.0.1'),
  DATA_DIR: z.string().default('./data'),
  BASE_URL: z.url({ protocol: /^https?$/ }).optional(),
  NODE_ENV: z.string().optional(),
  DEMO: z.enum(['0', '1']).optional(),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }).optional(),
  ANALYSE_PER_MINUTE: z.coerce.number().int().min(1).default(600),
  ANSWER_WITHIN_MS: z.coerce.number().int().min(0).max(600_000).default(2_000),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  CLIENT_DIR: z.string().optional(),
  CHECK_ANSWERS: z.enum(['0', '1']).default('0'),
});

const bracketed = (host: string) => (host.includes(':') ? `[${host}]` : host);
const reachable = (host: string) => (host === '0.0.0.0' || host === '::' ? 'localhost' : bracketed(host));

/**
 * Reads the environment, the only place that does, and makes the data directory.
 * An empty variable counts as absent.
 * @throws Error naming every variable that is wrong
 */
export function readConfig(environment: Readonly<Record<string, string | undefined>> = process.env): Config {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const parsed = Environment.safeParse(given);
  if (!parsed.success) {
    const lines = parsed.error.issues.map(({ path, message }) => `  ${path.join('.')}: ${message}`);
    throw new Error(`These environment variables are not right:\n${lines.join('\n')}`);
  }
  const variables = parsed.data;
  const dataDir = resolve(variables.DATA_DIR);
  mkdirSync(dataDir, { recursive: true });
  const production = variables.NODE_ENV === 'production';
  return {
    port: variables.PORT,
    host: variables.HOST,
    dataDir,
    baseUrl: (variables.BASE_URL ?? `http://${reachable(variables.HOST)}:${variables.PORT}`).replace(/\/+$/, ''),
    production,
    demo: variables.DEMO ? variables.DEMO === '1' : !production,
    smtpUrl: variables.SMTP_URL ?? null,
    analysePerMinute: variables.ANALYSE_PER_MINUTE,
    answerWithinMs: variables.ANSWER_WITHIN_MS,
    logLevel: variables.LOG_LEVEL,
    clientDir: variables.CLIENT_DIR ?? null,
    checkAnswers: variables.CHECK_ANSWERS === '1',
    secret: readSecret(dataDir),
  };
}
