import type { Loop } from '@/contract';
import { LoopError } from '@/analysis/loop/loop-error';
import type { ParallelGains } from '@/analysis/loop/model';

type Actuator = NonNullable<Loop['actuator']>;

/** What holds the command back, as deviations from the operating command. */
export interface ActuatorLimits {
  readonly low: number;
  readonly high: number;
  /** The most that the command moves in one sample period. */
  readonly stride: number;
  readonly antiWindup: Actuator['antiWindup'];
  /** h/Tt: the share of what was held back that leaves the integral in one sample period. */
  readonly tracking: number;
}

/**
 * An actuator's limits for one design. Tt absent means √(Ti·Td), or Ti without derivative, of the parallel gains.
 *
 * @throws LoopError for limits that leave no room, an operating command outside them, or a tracking time below the period
 */
export const actuatorLimits = (actuator: Actuator, gains: ParallelGains, period: number): ActuatorLimits => {
  const { operatingCommand, rate, antiWindup } = actuator;
  const [minimum, maximum] = [actuator.minimum ?? -Infinity, actuator.maximum ?? Infinity];
  if (minimum > maximum) throw refused('/actuator/minimum', `The minimum is at most the maximum, ${maximum}.`);
  if (operatingCommand < minimum || operatingCommand > maximum)
    throw refused('/actuator/operatingCommand', `The operating command lies within the limits, ${inWords(minimum, maximum)}.`);
  const usesTracking = antiWindup === 'backCalculation' && gains.ki !== 0;
  const trackingTime = usesTracking ? (actuator.trackingTime ?? usualTrackingTime(gains)) : Infinity;
  if (trackingTime < period)
    throw refused(
      '/actuator/trackingTime',
      `A tracking time is at least the sample period, ${period} s${actuator.trackingTime === null ? `; the usual one would be ${trackingTime} s` : ''}.`,
    );
  return {
    low: minimum - operatingCommand,
    high: maximum - operatingCommand,
    stride: (rate ?? Infinity) * period,
    antiWindup,
    tracking: period / trackingTime,
  };
};

/** √(Ti·Td), or Ti without derivative. @see REFERENCES numerics "Time responses" */
const usualTrackingTime = ({ kp, ki, kd }: ParallelGains): number => (kd === 0 ? Math.abs(kp / ki) : Math.sqrt(Math.abs(kd / ki)));

const inWords = (minimum: number, maximum: number): string =>
  maximum === Infinity ? `${minimum} or more` : minimum === -Infinity ? `${maximum} or less` : `from ${minimum} to ${maximum}`;

const refused = (pointer: string, detail: string) => new LoopError({ pointer, detail, code: 'outOfRange' });
