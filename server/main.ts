import { createServer } from 'node:http';
import closeWithGrace from 'close-with-grace';
import { seedDemo } from '@/db/seed/seed-demo';
import { createApp } from './app';
import { readConfig } from './config';
import { createContext } from './context';

const GRACE_MS = 5_000;

const config = readConfig();
const context = createContext(config);
const { log } = context;
const server = createServer(createApp(context));

closeWithGrace({ delay: GRACE_MS, logger: log }, async ({ err, signal }) => {
  if (err) log.fatal({ err }, 'ending after an error nobody caught');
  else log.info({ signal }, 'ending');
  server.closeIdleConnections();
  await new Promise((resolve) => server.close(resolve));
  await context.close();
});

if (config.demo) await seedDemo(context);
server.listen(config.port, config.host, () => log.info(`Kerbline is at ${config.baseUrl}`));
