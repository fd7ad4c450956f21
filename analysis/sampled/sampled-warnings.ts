import type { Loop, Warning } from '@/contract';
import type { LoopModel } from '@/analysis/loop/model';
import type { Stability } from '@/analysis/margins/stability';
import type { Complex } from '@/analysis/numbers/complex';

/** More digits would not help anyone who reads the sentence. */
const DIGITS = 4;

/** What a careful engineer would add to the numbers of a sampled loop, a sentence each. */
export const sampledWarnings = (
  { sampling, controller }: Loop,
  model: LoopModel,
  { stability, capped }: { stability: Stability; capped: boolean },
): Warning[] => {
  const { period } = sampling!;
  const { kp, kd, filterTime } = model.gains;
  const mode = fastestBeyond([...model.plant.poles, ...model.sensor.poles], Math.PI / period);
  const found: (Warning | false)[] = [
    mode !== null && {
      code: 'aliasing',
      message: `The plant swings at ${digits(mode)} rad/s, above half the sampling frequency (${digits(Math.PI / period)} rad/s): the computer sees it at ${digits(folded(mode, period))} rad/s.`,
    },
    kd !== 0 &&
      sampling!.derivative === 'trapezoidal' &&
      filterTime < period / 2 && {
        code: 'ringingDerivative',
        message:
          'The filter time of the derivative is shorter than half a sample period: by the trapezoidal rule its answer alternates in sign from sample to sample.',
      },
    controller.form === 'series' &&
      controller.kp > 0 &&
      Math.min(kp, kd) < 0 && {
        code: 'negativeConvertedGain',
        message: 'The filter time is longer than a time constant of the series form: in parallel form one of the gains is negative.',
      },
    stability.hidden.length > 0 && {
      code: 'hiddenMode',
      message: 'A mode that does not decay by itself is cancelled inside the loop: the loop gain does not show it, and it stays.',
    },
    stability.onBoundary && {
      code: 'onBoundary',
      message: 'A closed-loop pole lies on the unit circle: the loop is exactly on the edge of stability.',
    },
    stability.poles === null && {
      code: 'polesNotListed',
      message: 'The delay is so many sample periods long that the poles are not listed: stability is counted on the Nyquist curve.',
    },
    capped && {
      code: 'gridCapped',
      message: 'The curves are drawn with fewer points than they bend: 4,000 is the most. The numbers are exact.',
    },
  ];
  return found.filter((warning) => warning !== false);
};

/** The fastest swing above a frequency; null where there is none. */
const fastestBeyond = (poles: readonly Complex[], limit: number): number | null => {
  const swings = poles.map(({ im }) => im).filter((omega) => omega > limit);
  return swings.length > 0 ? Math.max(...swings) : null;
};

/** Where a frequency appears after sampling, in [0, π/h]. */
const folded = (omega: number, period: number): number => {
  const turn = (2 * Math.PI) / period;
  return Math.abs(omega - turn * Math.round(omega / turn));
};

const digits = (value: number): string => String(Number(value.toPrecision(DIGITS)));
