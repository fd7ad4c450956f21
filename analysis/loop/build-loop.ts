import type { Loop } from '@/contract';
import { buildController } from './controller';
import { buildFilters, lag } from './filters';
import { LoopError } from './loop-error';
import type { LoopModel } from './model';
import { toParallelGains } from './parallel-gains';
import { buildPlant } from './plant';

/**
 * A contract Loop as one loop in factored form.
 * @throws LoopError with a JSON Pointer into the Loop where it has no meaning or is not yet supported
 */
export const buildLoop = (loop: Loop): LoopModel => {
  if (loop.actuator && !loop.sampling)
    throw unsupported('/actuator', 'Actuator limits are computed for loops with a sample period: give one, or leave the limits out.');
  const { rational, deadTime } = buildPlant(loop.plant);
  const { controller } = loop;
  return {
    plant: rational,
    plantDeadTime: deadTime,
    sensor: lag(loop.sensor?.timeConstant ?? 0),
    sensorDeadTime: loop.sensor?.deadTime ?? 0,
    controller: buildController(controller),
    gains: toParallelGains(controller),
    filters: buildFilters(controller.filters),
    weights: controller.setpointWeights,
    feedforwardGain: controller.feedforward.gain,
    sampled: loop.sampling && { sampling: loop.sampling, filters: controller.filters, actuator: loop.actuator },
  };
};

const unsupported = (pointer: string, detail: string) => new LoopError({ pointer, detail, code: 'unsupported' });
