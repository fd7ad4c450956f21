/** Multiply-adds that the responses of one loop may cost: a dozen times what any believable loop needs. */
export const MOST_WORK = 1.5e8;

/** Ends a computation whose budget is spent. */
export class OutOfWork extends Error {}

/** Counts the work of one loop's responses, in steps rather than seconds, so that the same loop always ends the same way. */
export class WorkBudget {
  private left = MOST_WORK;

  /** @throws OutOfWork once more was spent than a loop may cost */
  spend(multiplyAdds: number): void {
    this.left -= multiplyAdds;
    if (!(this.left > 0)) throw new OutOfWork('The responses of this loop cost more than their budget of work.');
  }
}
