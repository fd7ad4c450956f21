// First load of the client: the scripts that index.html names, gzipped, stay under the budget.
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { buildAll } from './build.mjs';

const BUDGET = 350 * 1024;

const { client } = await buildAll();
const page = readFileSync(join(client, 'index.html'), 'utf8');
const scripts = [...page.matchAll(/<script[^>]+src="([^"]+)"/g)].map((match) => match[1]);
if (scripts.length === 0) throw new Error('index.html names no script');
const sizes = scripts.map((src) => [src, gzipSync(readFileSync(join(client, src))).length]);
const total = sizes.reduce((sum, [, size]) => sum + size, 0);
for (const [src, size] of sizes) console.log(`${(size / 1024).toFixed(1).padStart(8)} kB gzip  ${src}`);
console.log(`${(total / 1024).toFixed(1).padStart(8)} kB gzip in all, at most ${BUDGET / 1024}`);
process.exit(total <= BUDGET ? 0 : 1);
