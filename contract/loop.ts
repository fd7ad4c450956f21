import { z } from 'zod';
import { Controller } from './controller';
import { PlantModel, Sensor } from './plant-model';

/** A whole loop, as `POST /api/loops/analyse` takes it and the engine computes it. */

export const Sampling = z
  .strictObject({
    period: z.number().gt(0, 'A sample period is more than 0.').max(1e4, 'A sample period is at most 10,000 s.'),
    integral: z.enum(['backward', 'forward', 'trapezoidal']),
    derivative: z.enum(['backward', 'trapezoidal']),
    computationDelay: z.number().min(0, 'A computation delay is 0 or more.').max(1e4).default(0),
  })
  .meta({ id: 'Sampling' });
export type Sampling = z.infer<typeof Sampling>;

export const Actuator = z
  .strictObject({
    minimum: z.number().nullable(),
    maximum: z.number().nullable(),
    rate: z.number().gt(0, 'A rate limit is more than 0.').nullable().default(null),
    operatingCommand: z.number().default(0),
    antiWindup: z.enum(['none', 'conditional', 'backCalculation']).default('none'),
    trackingTime: z.number().gt(0, 'A tracking time is more than 0.').nullable().default(null),
  })
  .meta({ id: 'Actuator' });
export type Actuator = z.infer<typeof Actuator>;

const step = (name: string) => z.number().refine((x) => Math.abs(x) <= 1e12, `${name} is a number of magnitude at most 1e12.`);

export const Responses = z.strictObject({
  duration: z.number().gt(0, 'A duration is more than 0.').max(1e7, 'A duration is at most 10,000,000 s.').nullable().default(null),
  referenceStep: step('A reference step').default(1),
  loadStep: step('A load step').default(1),
});
export type Responses = z.infer<typeof Responses>;

export const Loop = z
  .strictObject({
    plant: PlantModel,
    controller: Controller,
    sensor: Sensor.nullable().default(null),
    sampling: Sampling.nullable().default(null),
    actuator: Actuator.nullable().default(null),
    responses: Responses.default({ duration: null, referenceStep: 1, loadStep: 1 }),
    at: z.array(z.number().gt(0, 'A frequency is more than 0.').max(1e12)).max(1000, 'At most 1,000 frequencies.').default([]),
  })
  .meta({ id: 'Loop' });
export type Loop = z.infer<typeof Loop>;
export type LoopInput = z.input<typeof Loop>;
