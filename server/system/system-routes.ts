import { z } from 'zod';
import { DevMail, Health } from '@/contract';
import { engineVersion } from '@/analysis';
import { listMessages } from '@/db/stores/mail-store';
import { NotFound, Problem } from '../http/problem';
import { route } from '../http/route';
import { isLoopback } from './loopback';

const MOST_MESSAGES = 200;

export const systemRoutes = [
  route({
    method: 'get',
    path: '/api/health',
    summary: 'Whether the server and its database are well',
    tag: 'System',
    access: 'public',
    output: Health,
    handler: ({ context }) => {
      const wrong = context.wrongPragmas();
      if (wrong.length > 0) throw new Problem(503, `The database is not set up as it must be: ${wrong.join(', ')}.`);
      return { status: 'ok' as const, engineVersion, database: 'ok' as const };
    },
  }),
  route({
    method: 'get',
    path: '/api/dev/mail',
    summary: 'What the local mail fake kept, newest first',
    tag: 'System',
    access: 'public',
    input: { query: z.strictObject({ to: z.string().max(254).optional() }) },
    output: z.object({ items: z.array(DevMail) }),
    handler: ({ context: { config, mailer, db }, query, request }) => {
      if (!mailer.fake || config.production || !isLoopback(request)) throw new NotFound();
      const items = listMessages(db, query.to, MOST_MESSAGES).map(({ id: _id, createdAt, ...message }) => ({
        ...message,
        at: createdAt.toISOString(),
      }));
      return { items };
    },
  }),
];
