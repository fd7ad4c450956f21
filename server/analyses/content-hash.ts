import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';

/**
 * SHA-256, in hexadecimal, over the canonical JSON (RFC 8785) of a value: the same for the same content,
 * whatever the order of its keys.
 */
export function contentHash(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('Only what JSON can say has a content hash.');
  return createHash('sha256').update(text).digest('hex');
}
