import type { ProblemError } from '@/contract';
import { Meaningless, Problem } from '../http/problem';

/** The engine will not compute this loop; `error.pointer` points into the loop, `#` being all of it. */
export class LoopRefused extends Meaningless {
  /** @param index which of several loops it was */
  constructor(
    readonly error: ProblemError,
    readonly index = 0,
  ) {
    super([error]);
  }
}

/** More loops wait than can be computed in good time. */
export class TooBusy extends Problem {
  constructor() {
    super(503, 'Too many loops are waiting to be analysed. Try again in a moment.', { headers: { 'Retry-After': '2' } });
  }
}
