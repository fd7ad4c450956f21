import { LoopError } from '@/analysis/loop/loop-error';
import type { LoopModel, SampledRun } from '@/analysis/loop/model';

/** Delays beyond this many sample periods are refused rather than worked through. */
export const MOST_PERIODS = 1000;

/** An unstable mode that grows by more than e^15 between two samples cannot be seen by any computer. */
const FASTEST_GROWTH = 15;

/** @throws LoopError for what only a sampled loop refuses, each at its field and with what would be right */
export const refuseUnsampled = (model: LoopModel, { sampling, filters }: SampledRun): void => {
  const { period, derivative, computationDelay } = sampling;
  const { gains, plantDeadTime, sensorDeadTime } = model;
  if (derivative === 'trapezoidal' && gains.kd !== 0 && gains.filterTime === 0)
    throw refused(
      '/sampling/derivative',
      'A derivative without filter (Tf = 0) is computed by backward Euler: by the trapezoidal rule it would swing for ever.',
    );
  filters.forEach((filter, i) => {
    if (filter.kind === 'notch' && !(filter.frequency * period < Math.PI))
      throw refused(
        `/controller/filters/${i}/frequency`,
        `At a sample period of ${period} s a notch stands below π/h = ${Math.PI / period} rad/s.`,
      );
  });
  const delays = [
    ['/plant/deadTime', 'dead time', plantDeadTime],
    ['/sensor/deadTime', 'dead time', sensorDeadTime],
    ['/sampling/computationDelay', 'computation delay', computationDelay],
  ] as const;
  const total = plantDeadTime + sensorDeadTime + computationDelay;
  if (total > MOST_PERIODS * period) {
    const [pointer, name] = delays.reduce((longest, delay) => (delay[2] > longest[2] ? delay : longest));
    throw refused(pointer, `A ${name} of ${total / period} sample periods is too long: from 0 to ${MOST_PERIODS} periods in all.`);
  }
  const growth = Math.max(...[...model.plant.poles, ...model.sensor.poles].map(({ re }) => re), 0);
  if (growth * period > FASTEST_GROWTH)
    throw refused('/sampling/period', `The plant grows by more than e^${FASTEST_GROWTH} within one sample period: sample it faster.`);
};

const refused = (pointer: string, detail: string) => new LoopError({ pointer, detail, code: 'outOfRange' });
