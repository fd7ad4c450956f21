import { randomBytes } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** The server's own secret, made at the first start and kept in the data directory for its owner's eyes only. */
export function readSecret(dataDir: string): string {
  const file = join(dataDir, 'secret');
  try {
    writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600, flag: 'wx' });
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
  }
  return readFileSync(file, 'utf8');
}
