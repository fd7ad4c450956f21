import type { CaseResult } from '@/contract';
import { contentHash } from './content-hash';

/** Of the numbers alone: what they are judged to be worth may be worded otherwise later. */
export const hashResults = (results: readonly CaseResult[]) =>
  contentHash(results.map(({ case: { id }, numbers }) => ({ case: id, numbers })));
