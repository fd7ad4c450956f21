import { Problem } from './problem';

/** The ETag of a thing's version: strong, because every edit counts. */
export const etagOf = (version: number) => `"${version}"`;

/** 412: another change came first. */
export const changedMeanwhile = (headers?: Record<string, string>) =>
  new Problem(412, 'Someone has changed this since you read it. Read it again, then make your change.', { headers });

/**
 * Two people may edit the same thing; whoever writes says which version they saw.
 * @throws Problem 428 without If-Match, 412 where it names another version
 */
export function expectVersion(ifMatch: string | undefined, version: number): void {
  if (!ifMatch) throw new Problem(428, 'Say in If-Match which version you are changing: the ETag that came with it.');
  const tags = ifMatch.split(',').map((tag) => tag.trim());
  if (!tags.includes('*') && !tags.includes(etagOf(version))) throw changedMeanwhile({ ETag: etagOf(version) });
}
