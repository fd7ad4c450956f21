// Builds what `npm start` serves. Each part goes into a folder named after the hash of its inputs, made under another name
// and renamed into place: a second start beside the first never sees half a build, and nothing is built twice.
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, statSync } from 'node:fs';
import { join, relative } from 'node:path';
import { spawnSync } from 'node:child_process';
import { root } from './root.mjs';

const DIST = join(root, 'dist');
const KEEP_OLD_MS = 24 * 3600_000;

const clientInputs = [
  'app',
  'components',
  'hooks',
  'figures',
  'analysis',
  'contract',
  'assets',
  'public',
  'app.json',
  'metro.config.cjs',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
const serverInputs = ['server', 'db', 'figures', 'analysis', 'contract', 'tsconfig.json', 'package-lock.json', 'scripts/build.mjs'];

function* filesUnder(path) {
  if (!existsSync(path)) return;
  if (!statSync(path).isDirectory()) return yield path;
  for (const name of readdirSync(path).sort()) yield* filesUnder(join(path, name));
}

function hashOf(inputs) {
  const hash = createHash('sha256').update(process.version);
  for (const input of inputs) {
    for (const file of filesUnder(join(root, input)))
      hash.update(relative(root, file)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex').slice(0, 16);
}

/** Folder of a finished build; `make(folder)` fills a fresh one when there is none yet. */
async function built(part, inputs, make) {
  const target = join(DIST, `${part}-${hashOf(inputs)}`);
  if (existsSync(target)) return target;
  const fresh = `${target}.${process.pid}`;
  rmSync(fresh, { recursive: true, force: true });
  mkdirSync(fresh, { recursive: true });
  try {
    await make(fresh);
    renameSync(fresh, target);
  } catch (error) {
    rmSync(fresh, { recursive: true, force: true });
    if (!existsSync(target)) throw error;
  }
  dropOld(part, target);
  return target;
}

/** Another start may still serve an older build, so only those untouched for a day go. */
function dropOld(part, current) {
  for (const name of readdirSync(DIST)) {
    const path = join(DIST, name);
    if (name.startsWith(`${part}-`) && path !== current && Date.now() - statSync(path).mtimeMs > KEEP_OLD_MS)
      rmSync(path, { recursive: true, force: true });
  }
}

function exportClient(folder) {
  console.log('Building the client (about a minute the first time)');
  const cli = join(root, 'node_modules', 'expo', 'bin', 'cli');
  const env = { ...process.env, CI: '1', EXPO_NO_TELEMETRY: '1', EXPO_OFFLINE: '1', NODE_ENV: 'production' };
  const { status, stdout, stderr } = spawnSync(process.execPath, [cli, 'export', '--platform', 'web', '--output-dir', folder], {
    cwd: root,
    env,
    encoding: 'utf8',
    maxBuffer: 1 << 26,
  });
  if (status !== 0) throw new Error(`expo export ended with ${status}:\n${stdout}\n${stderr}`);
}

async function bundleServer(folder) {
  const { build } = await import('esbuild');
  await build({
    absWorkingDir: root,
    entryPoints: { server: 'server/main.ts', worker: 'server/jobs/worker.ts' },
    outdir: folder,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    sourcemap: true,
    logLevel: 'warning',
  });
}

/** Builds what is missing and answers where it stands: { client, server } folders. */
export async function buildAll() {
  const [client, server] = [await built('client', clientInputs, exportClient), await built('server', serverInputs, bundleServer)];
  return { client, server };
}

if (process.argv[1] === new URL(import.meta.url).pathname) console.log(await buildAll());
