import { defaultTarget } from '@/analysis/project';
import { isInRange, quantityRules, type Limit } from '@/contract';
import type { Database } from '@/db/open';
import { readLimits, writeLimits, type KeptLimits } from '@/db/stores/limits-store';
import type { Stamp } from '@/db/stores/stamp';
import { activityEntry } from '../activity/activity-entry';
import { changedMeanwhile } from '../http/etag';
import { Meaningless } from '../http/problem';

interface Replacement {
  readonly projectId: string;
  /** The version that the editor saw. */
  readonly version: number;
  readonly items: Limit[];
}

/** A default target that no loop can meet would leave every design tight for ever. */
function refuseImpossibleTargets(items: readonly Limit[]): void {
  const errors = items.flatMap((demand, index) => {
    if (demand.target !== null) return [];
    const target = defaultTarget(demand);
    if (target === null || isInRange(demand.quantity, target)) return [];
    const detail = `Left empty, the target would be ${Number(target.toPrecision(4))}, and this quantity is ${quantityRules[demand.quantity].range}: name one.`;
    return [{ pointer: `/items/${index}/target`, detail }];
  });
  if (errors.length > 0) throw new Meaningless(errors);
}

const demanded = (count: number) => (count === 0 ? 'took all limits away' : `set ${count === 1 ? 'one limit' : `${count} limits`}`);

/**
 * Puts these limits in place of all others.
 * @throws Meaningless where a default target cannot be met, Problem 412 where another change came first
 */
export function replaceLimits(db: Database, { projectId, version, items }: Replacement, stamp: Stamp): KeptLimits {
  refuseImpossibleTargets(items);
  const activity = activityEntry('limits.set', demanded(items.length));
  if (!writeLimits(db, { projectId, version, items, activity, stamp })) throw changedMeanwhile();
  return readLimits(db, projectId);
}
