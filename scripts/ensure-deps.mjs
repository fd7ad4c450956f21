// Installs what a fresh clone lacks, and nothing when nothing is missing. Node built-ins only: it runs before anything is installed.
//   node scripts/ensure-deps.mjs [--chromium]
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const stampFile = join(root, 'node_modules', '.kerbline-deps');
const lockDir = join(root, '.install-lock');
const LOCK_STALE_MS = 15 * 60_000;

const has = (command) => spawnSync('sh', ['-c', `command -v ${command}`], { stdio: 'ignore' }).status === 0;

function run(command, args, env = {}) {
  const { status } = spawnSync(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } });
  if (status !== 0) {
    console.error(`\n«${command} ${args.join(' ')}» ended with ${status}. Nothing was started.`);
    process.exit(1);
  }
}

/** Debian packages, as root or through sudo; says what to run where neither is possible. */
function installDebian(packages) {
  const asRoot = process.getuid?.() === 0;
  if (!has('apt-get') || (!asRoot && !has('sudo'))) {
    console.error(`Missing here: ${packages.join(' ')}. Install them, then run this again.`);
    process.exit(1);
  }
  const prefix = asRoot ? [] : ['sudo'];
  const [command, ...rest] = [...prefix, 'apt-get'];
  console.log(`Installing ${packages.join(' ')} from Debian`);
  run(command, [...rest, 'update', '-qq']);
  run(command, [...rest, 'install', '-y', '-qq', '--no-install-recommends', ...packages], { DEBIAN_FRONTEND: 'noninteractive' });
}

const stamp = () =>
  createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .update(process.version)
    .digest('hex');

const installed = () => existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp();

/** better-sqlite3 is compiled here: Node's own headers, where Node brought them, save a download. */
function compileSettings() {
  const prefix = join(dirname(process.execPath), '..');
  const headers = existsSync(join(prefix, 'include', 'node', 'node.h')) ? { npm_config_nodedir: prefix } : {};
  return { npm_config_build_from_source: 'true', ...headers };
}

/** Two starts beside each other must not both run npm ci in one folder: the second waits for the first. */
function withInstallLock(work) {
  for (;;) {
    try {
      mkdirSync(lockDir);
      break;
    } catch {
      if (installed()) return;
      const age = existsSync(lockDir) ? Date.now() - statSync(lockDir).mtimeMs : 0;
      if (age > LOCK_STALE_MS) rmSync(lockDir, { recursive: true, force: true });
      else Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 1000);
    }
  }
  try {
    if (!installed()) work();
  } finally {
    rmSync(lockDir, { recursive: true, force: true });
  }
}

if (!installed()) {
  const tools = { python3: 'python3', make: 'make', 'g++': 'g++' };
  const missing = Object.keys(tools).filter((command) => !has(command));
  if (missing.length > 0) installDebian(missing.map((command) => tools[command]));
  withInstallLock(() => {
    console.log('Installing packages (about two minutes the first time)');
    run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], compileSettings());
    writeFileSync(stampFile, stamp());
  });
}

if (process.argv.includes('--chromium') && !has('chromium')) installDebian(['chromium']);
