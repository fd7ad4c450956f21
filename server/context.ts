import { join } from 'node:path';
import pino, { type Logger } from 'pino';
import { openDatabase, type Database, type OpenDatabase } from '@/db/open';
import { createAuth, type Auth } from './auth/auth';
import type { Config } from './config';
import { createJobBoard, type JobBoard } from './jobs/job-board';
import { createLoopPool, type LoopPool } from './jobs/loop-pool';
import { createMailer, type Mailer } from './mail/mailer';

/** Everything a handler or a service may need, made once. */
export interface Context {
  readonly config: Config;
  readonly db: Database;
  readonly wrongPragmas: OpenDatabase['wrongPragmas'];
  readonly auth: Auth;
  readonly mailer: Mailer;
  readonly jobs: LoopPool;
  readonly board: JobBoard;
  readonly log: Logger;
  readonly close: () => Promise<void>;
}

/** Opens the database and makes the parts; tests replace some of them. */
export function createContext(config: Config, replaced: Partial<Pick<Context, 'jobs' | 'mailer' | 'log'>> = {}): Context {
  const log = replaced.log ?? pino({ level: config.logLevel });
  const { db, wrongPragmas, close } = openDatabase(join(config.dataDir, 'kerbline.sqlite'));
  const mailer = replaced.mailer ?? createMailer(config, db);
  const jobs = replaced.jobs ?? createLoopPool({ onError: (error) => log.error({ err: error }, 'a worker thread ended') });
  return {
    config,
    db,
    wrongPragmas,
    auth: createAuth({ config, db, mailer, log }),
    mailer,
    jobs,
    board: createJobBoard((error) => log.error({ err: error }, 'unforeseen error in a job')),
    log,
    close: async () => {
      await jobs.close();
      close();
    },
  };
}
