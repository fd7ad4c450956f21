import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The `drizzle/` folder above this file, wherever a bundler put it. */
export function migrationsFolder(): string {
  for (let folder = dirname(fileURLToPath(import.meta.url)); folder !== dirname(folder); folder = dirname(folder)) {
    const candidate = join(folder, 'drizzle');
    if (existsSync(join(candidate, 'meta', '_journal.json'))) return candidate;
  }
  throw new Error('The folder drizzle/ with the migrations stands nowhere above the program.');
}
