// npm run bench:cases: judging 400 cases through the server, against as many margins-only analyses one after the other, and on
// two threads against one. Server and worker are bundled as they run in production.
import { execFileSync } from 'node:child_process';
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { build } from 'esbuild';
import { root } from '../root.mjs';

// Inside the repository, so that what the bundle leaves outside is found.
const scratch = join(root, 'node_modules', '.cache', `kerbline-bench-${process.pid}`);
mkdirSync(scratch, { recursive: true });
try {
  await build({
    entryPoints: { bench: join(root, 'scripts', 'bench', 'bench-cases.ts'), worker: join(root, 'server', 'jobs', 'worker.ts') },
    outdir: scratch,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    alias: { '@': root },
  });
  execFileSync(process.execPath, [join(scratch, 'bench.mjs'), scratch], { cwd: root, stdio: 'inherit' });
} finally {
  rmSync(scratch, { recursive: true, force: true });
}
