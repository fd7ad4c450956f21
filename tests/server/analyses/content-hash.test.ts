import { describe, expect, it } from 'vitest';
import { contentHash } from '@/server/analyses/content-hash';

describe('a content hash', () => {
  it('is SHA-256 over the RFC 8785 form', () => {
    // RFC 8785 section 3.2.2 prints this canonical form; its SHA-256 is `printf … | sha256sum`.
    const literals = {
      literals: [null, true, false],
      numbers: [333333333.33333329, 1e30, 4.5, 2e-3, 1e-27],
      string: '€$\u000f\nA\'B"\\\\"/',
    };
    expect(contentHash(literals)).toBe('2d5e01a318d0f0879ab568c4be289c8b1f64ef8921a53c6277d5e069978baacb');
  });

  it('does not depend on the order of keys, but on that of items', () => {
    expect(contentHash({ a: 1, b: { c: 2, d: 3 } })).toBe(contentHash({ b: { d: 3, c: 2 }, a: 1 }));
    expect(contentHash([1, 2])).not.toBe(contentHash([2, 1]));
  });

  it('tells numbers apart to the last digit', () => {
    expect(contentHash({ kp: 1.05 })).not.toBe(contentHash({ kp: 1.0500000000000003 }));
  });

  it('refuses what JSON cannot say', () => {
    expect(() => contentHash(undefined)).toThrow(TypeError);
    expect(() => contentHash({ kp: NaN })).toThrow();
  });
});
