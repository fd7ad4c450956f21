// npm run dev: Metro with fast refresh on PORT hands /api to Express, which restarts by itself when server code changes.
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { root } from './root.mjs';

const port = Number(process.env.PORT ?? 3000);
const host = '127.0.0.1';
const api = `http://${host}:${port + 1}`;

const start = (args, env) => spawn(process.execPath, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });

const children = [
  start(['--import', 'tsx', '--watch', '--watch-preserve-output', 'server/main.ts'], {
    PORT: String(port + 1),
    HOST: host,
    BASE_URL: `http://localhost:${port}`,
  }),
  start([join('node_modules', 'expo', 'bin', 'cli'), 'start', '--web', '--port', String(port)], {
    KERBLINE_API: api,
    EXPO_NO_TELEMETRY: '1',
    EXPO_OFFLINE: '1',
    BROWSER: 'none',
  }),
];

// One that ends takes the other with it; the server treats a second signal as impatience.
let stopping = false;
function stop() {
  if (stopping) return;
  stopping = true;
  for (const child of children) if (child.exitCode === null) child.kill('SIGTERM');
}
process.on('SIGINT', stop);
process.on('SIGTERM', stop);
for (const child of children) child.on('exit', stop);
