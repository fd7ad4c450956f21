import type { Conditions } from '@/contract';
import { sameContent } from './same-content';

/** What stands otherwise than when an analysis was kept. */
export type Change = 'cases' | 'plants' | 'limits' | 'operatingRange';

type Content = Conditions['cases'][number];

const byId = (cases: readonly Content[]) => new Map(cases.map((one) => [one.id, one]));

const samePlant = (a: Content, b: Content) => a.plant.id === b.plant.id && a.plant.revision === b.plant.revision;

const sameCase = (a: Content, b: Content) =>
  sameContent([a.name, a.parameters, a.axes, a.basis, a.plant.id], [b.name, b.parameters, b.axes, b.basis, b.plant.id]);

/** Whether a case's loop is another one than it was: another name or place on the axes does not change its numbers. */
export const runsOtherwise = (then: Content, now: Content): boolean =>
  !samePlant(then, now) || !sameContent(then.parameters, now.parameters);

/** What changed between the conditions that an analysis was kept under and those of now. */
export function changedSince(then: Conditions, now: Conditions): Change[] {
  const before = byId(then.cases);
  const pairs = now.cases.map((one) => ({ one, was: before.get(one.id) }));
  const cases = then.cases.length !== now.cases.length || pairs.some(({ one, was }) => was === undefined || !sameCase(was, one));
  const plants = pairs.some(({ one, was }) => was !== undefined && !samePlant(was, one));
  return [
    ...(cases ? ['cases' as const] : []),
    ...(plants ? ['plants' as const] : []),
    ...(sameContent(then.limits, now.limits) ? [] : ['limits' as const]),
    ...(sameContent(then.operatingRange, now.operatingRange) ? [] : ['operatingRange' as const]),
  ];
}
