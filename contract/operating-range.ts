import { z } from 'zod';
import { Axis } from './case';

/** Where the loop is used along one axis, and which end of what was checked is the end of what can happen. */
export const OperatingRange = z
  .strictObject({
    axis: Axis,
    engage: z.number().nullable().default(null).meta({ description: 'the loop takes up from here' }),
    disengage: z.number().nullable().default(null).meta({ description: 'the loop lets go below this' }),
    lowIsPhysical: z.boolean().meta({ description: 'nothing lower than the lowest case can happen' }),
    highIsPhysical: z.boolean().meta({ description: 'nothing higher than the highest case can happen' }),
  })
  .refine(({ engage, disengage }) => engage === null || disengage === null || engage >= disengage, {
    path: ['engage'],
    error: 'The loop takes up no lower than it lets go.',
  })
  .meta({ id: 'OperatingRange' });
export type OperatingRange = z.infer<typeof OperatingRange>;

export const OperatingRanges = z.array(OperatingRange).superRefine((ranges, context) => {
  ranges.forEach(({ axis }, index) => {
    if (ranges.findIndex((other) => other.axis === axis) < index)
      context.addIssue({ code: 'custom', path: [index, 'axis'], message: 'Each axis is declared once.' });
  });
});
