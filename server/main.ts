import { createServer } from 'node:http';
import closeWithGrace from 'close-with-grace';
import { seedDemo } from '@/db/seed/seed-demo';
import { createApp } from './app';
import { readConfig, type Config } from './config';
import { createContext } from './context';

/** How long requests under way may take to end, and when the process ends whatever still runs, ms. */
const PATIENCE_MS = 2_000;
const GRACE_MS = 5_000;

function configOrExit(): Config {
  try {
    return readConfig();
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : error}\n`);
    process.exit(1);
  }
}

const config = configOrExit();
const context = createContext(config);
const { log } = context;
const server = createServer(createApp(context));

closeWithGrace({ delay: GRACE_MS, logger: log }, async ({ err, signal }) => {
  if (err) log.fatal({ err }, 'ending after an error nobody caught');
  else log.info({ signal }, 'ending');
  const impatience = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
  await new Promise((resolve) => server.close(resolve));
  clearTimeout(impatience);
  await context.close();
});

if (config.demo) await seedDemo(context);
server.listen(config.port, config.host, () => process.stdout.write(`Kerbline is at ${config.baseUrl}\n`));
