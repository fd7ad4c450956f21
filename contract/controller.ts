import { z } from 'zod';

/** Controller settings as numerics.md defines them. Zero and negative gains are legal (a brake loop has them). */

const MAX_GAIN = 1e12;
const MAX_TIME = 1e6;
const gain = (name: string) => z.number().refine((x) => Math.abs(x) <= MAX_GAIN, `${name} is a number of magnitude at most 1e12.`);
const time = (name: string) => z.number().min(0, `${name} is 0 or more.`).max(MAX_TIME, `${name} is at most 1,000,000 s.`);
const positiveTime = (name: string) => time(name).refine((x) => x > 0, `${name} is more than 0.`);

export const SetpointWeights = z.strictObject({
  proportional: z.number().min(-10).max(10).default(1).meta({ description: 'b' }),
  derivative: z.number().min(-10).max(10).default(0).meta({ description: 'c' }),
});

export const Filter = z
  .discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('lowPass'), timeConstant: time('A time constant') }),
    z.strictObject({
      kind: z.literal('notch'),
      frequency: z.number().gt(0, 'A notch stands at a frequency above 0.').max(1e9),
      depth: z.number().min(0, 'Depth is from 0 to 1.').max(1, 'Depth is from 0 to 1.'),
      width: z.number().gt(0, 'Width is more than 0.').max(100, 'Width is at most 100.'),
    }),
    z.strictObject({ kind: z.literal('leadLag'), zeroTime: time('A zero time'), poleTime: positiveTime('A pole time') }),
  ])
  .meta({ id: 'Filter' });
export type Filter = z.infer<typeof Filter>;

const shared = {
  derivativeFilterTime: time('Tf').default(0).meta({ description: 'Tf, s' }),
  setpointWeights: SetpointWeights.default({ proportional: 1, derivative: 0 }),
  feedforward: z.strictObject({ gain: gain('A feedforward gain').default(0) }).default({ gain: 0 }),
  filters: z.array(Filter).max(8, 'At most 8 filters.').default([]),
};

const byTimes = {
  kp: gain('Kp'),
  ti: positiveTime('Ti').nullable().meta({ description: 's; null means no integral action' }),
  td: time('Td').default(0),
  ...shared,
};

export const ParallelController = z
  .strictObject({ form: z.literal('parallel'), kp: gain('Kp'), ki: gain('Ki').default(0), kd: gain('Kd').default(0), ...shared })
  .meta({ id: 'ParallelController' });
export const IdealController = z.strictObject({ form: z.literal('ideal'), ...byTimes }).meta({ id: 'IdealController' });
export const SeriesController = z.strictObject({ form: z.literal('series'), ...byTimes }).meta({ id: 'SeriesController' });

export const Controller = z.discriminatedUnion('form', [ParallelController, IdealController, SeriesController]).meta({ id: 'Controller' });
export type Controller = z.infer<typeof Controller>;
