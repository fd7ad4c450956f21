import type { Limit, Loop } from '@/contract';
import type { ChartLimits } from './loop-picture';

type Drawn = 'ms' | 'phaseMargin' | 'gainMargin' | 'overshootPercent' | 'settlingTime';

const drawn: readonly Drawn[] = ['ms', 'phaseMargin', 'gainMargin', 'overshootPercent', 'settlingTime'];

/** A greatest Ms, however it was demanded: a least modulus margin is the same circle round −1. The stricter of both where both stand. */
function msLimit(limits: readonly Limit[]): number | undefined {
  const asked = limits.flatMap(({ quantity, limit }) => (quantity === 'ms' ? [limit] : quantity === 'modulusMargin' ? [1 / limit] : []));
  return asked.length === 0 ? undefined : Math.min(...asked);
}

/** What of a project's demands the charts draw as kerbs, and the ends of the actuator. */
export function chartLimits(limits: readonly Limit[], actuator: Loop['actuator'] = null): ChartLimits {
  const asked = drawn.map((quantity) => [quantity, limits.find((limit) => limit.quantity === quantity)?.limit] as const);
  return {
    ...Object.fromEntries(asked.filter(([, limit]) => limit !== undefined)),
    ms: msLimit(limits),
    controlMinimum: actuator?.minimum ?? undefined,
    controlMaximum: actuator?.maximum ?? undefined,
  };
}
