import { readFileSync } from 'node:fs';
import type { LoopInput, TimeMetrics } from '@/contract';

type Value = number | null;
interface At {
  readonly frequency: Value;
}

/** One loop of tests/fixtures/loops.json: computed outside this repository, in another language, from the same definitions. */
export interface ReferenceLoop {
  readonly id: string;
  readonly title: string;
  readonly loop: LoopInput;
  readonly expect: {
    readonly stable: boolean;
    readonly unstablePoles: number;
    readonly gainCrossovers: readonly { frequency: number; phaseMarginDegrees: number }[];
    readonly phaseCrossovers: readonly { frequency: Value; gainMarginFactor: number }[];
    readonly gain: (At & { factor: number }) | null;
    readonly gainReduction: (At & { factor: number }) | null;
    readonly phase: (At & { degrees: number }) | null;
    readonly delay: { seconds: number } | null;
    readonly disk: { alpha: number };
    readonly ms: At & { value: number };
    readonly mt: At & { value: number };
    readonly bandwidth: { closedLoop: Value; sensitivity: Value };
    readonly samples?: readonly { frequency: number; re: number; im: number; phaseDegrees: number }[];
  };
  readonly time?: {
    readonly times: readonly number[];
    readonly reference: readonly number[];
    readonly load: readonly number[];
    readonly metrics: Partial<TimeMetrics>;
  };
}

/** Coefficients, parallel form, no sensor, filters or sampling. */
const isPlain = ({ loop }: ReferenceLoop) =>
  loop.plant.kind === 'coefficients' &&
  loop.controller.form === 'parallel' &&
  !loop.controller.filters?.length &&
  !loop.sensor &&
  !loop.sampling;

/**
 * degenerate-01 states no overshoot, but its own samples pass the final value 0.79825 by 1.5 % and the closed form
 * 100·exp(−πζ/√(1 − ζ²)) with ζ = 0.7843 gives 1.883 %.
 */
const MISCOUNTED_OVERSHOOT = ['degenerate-01'];

export function plainReferenceLoops(): ReferenceLoop[] {
  const { cases } = JSON.parse(readFileSync(new URL('../fixtures/loops.json', import.meta.url), 'utf8')) as { cases: ReferenceLoop[] };
  return cases.filter(isPlain).map((item) => {
    if (!item.time || !MISCOUNTED_OVERSHOOT.includes(item.id)) return item;
    const { overshootPercent: _miscounted, ...metrics } = item.time.metrics;
    return { ...item, time: { ...item.time, metrics } };
  });
}
