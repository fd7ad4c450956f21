import { Conflict } from './problem';

/** 409 for a revision that was built on another than the latest. */
export function staleRevision(latest: number): Conflict {
  const detail = `Revision ${latest} is the latest now. Look at it, then make your change on top of it.`;
  return new Conflict(detail, [{ pointer: '/baseRevision', detail }]);
}
