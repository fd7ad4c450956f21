import { z } from 'zod';
import { ComplexNumber } from './plant-model';

/** What the engine says of one loop. `null` means what numerics.md says it means there: no finite limit, or no such passage. */

const Frequency = z.number().meta({ description: 'rad/s' });
const Peak = z.object({ value: z.number(), decibels: z.number(), frequency: Frequency.nullable() });
const GainMargin = z.object({ factor: z.number(), decibels: z.number(), frequency: Frequency.nullable() });

export const Margins = z
  .object({
    gain: GainMargin.nullable(),
    gainReduction: GainMargin.nullable(),
    phase: z.object({ degrees: z.number(), frequency: Frequency }).nullable(),
    delay: z.object({ seconds: z.number(), frequency: Frequency.nullable() }).nullable(),
    disk: z.object({ alpha: z.number(), gainLow: z.number(), gainHigh: z.number().nullable(), phaseDegrees: z.number() }),
    modulus: z.number(),
    gainCrossovers: z.array(z.object({ frequency: Frequency, phaseMarginDegrees: z.number() })),
    phaseCrossovers: z.array(z.object({ frequency: Frequency.nullable(), gainMarginFactor: z.number() })),
  })
  .meta({ id: 'Margins' });
export type Margins = z.infer<typeof Margins>;

export const SensitivityPeaks = z
  .object({ ms: Peak, mt: Peak, noiseGain: z.object({ value: z.number().nullable(), frequency: Frequency.nullable() }) })
  .meta({
    id: 'SensitivityPeaks',
    description: 'noiseGain.value is null where the command answers noise without bound (an improper controller)',
  });

const numbers = z.array(z.number());
const Curve = z.object({ magnitude: numbers, phaseDegrees: numbers });

export const FrequencyResponse = z
  .object({
    frequencies: numbers,
    loop: z.object({ magnitude: numbers, phaseDegrees: numbers, real: numbers, imaginary: numbers }),
    plant: Curve,
    controller: Curve,
    sensitivity: numbers,
    complementarySensitivity: numbers,
    loadSensitivity: numbers,
    noiseSensitivity: numbers,
  })
  .meta({ id: 'FrequencyResponse', description: 'magnitudes are factors; phases unwrapped' });
export type FrequencyResponse = z.infer<typeof FrequencyResponse>;

const Series = z.object({ time: numbers, output: numbers, control: numbers });
export const TimeSeries = Series.meta({ id: 'TimeSeries' });
export type TimeSeries = z.infer<typeof TimeSeries>;

const metric = z.number().nullable();
export const TimeMetrics = z
  .object({
    finalValue: metric,
    riseTime: metric,
    settlingTime: metric,
    overshootPercent: metric,
    undershootPercent: metric,
    peakTime: metric,
    steadyStateError: metric,
    iae: metric,
    itae: metric,
    controlTotalVariation: metric,
    controlPeak: metric,
    timeAtLimits: metric,
    loadPeak: metric,
    loadPeakTime: metric,
    loadSettlingTime: metric,
    loadIae: metric,
  })
  .meta({ id: 'TimeMetrics' });
export type TimeMetrics = z.infer<typeof TimeMetrics>;

export const TimeResponse = z
  .object({
    reference: Series.optional(),
    load: Series.optional(),
    linear: z
      .object({ reference: Series, load: Series })
      .optional()
      .meta({ description: "the same without the actuator's limits, where there are any" }),
    metrics: TimeMetrics.nullable().meta({ description: 'null where the loop is unstable' }),
  })
  .meta({ id: 'TimeResponse', description: 'the two series are left out under ?curves=false' });
export type TimeResponse = z.infer<typeof TimeResponse>;

export const Warning = z.object({ code: z.string(), message: z.string() });
export type Warning = z.infer<typeof Warning>;

export const ClosedLoop = z.object({
  stable: z.boolean(),
  unstablePoles: z.int(),
  encirclements: z.int().meta({ description: 'clockwise, of −1' }),
  encirclementsNeeded: z.int().meta({ description: 'clockwise encirclements that a stable loop has: minus the unstable open-loop poles' }),
  poles: z.array(ComplexNumber).nullable(),
});
export type ClosedLoop = z.infer<typeof ClosedLoop>;

export const Analysis = z
  .object({
    engineVersion: z.string(),
    closedLoop: ClosedLoop,
    margins: Margins,
    sensitivity: SensitivityPeaks,
    bandwidth: z.object({ closedLoop: Frequency.nullable(), reference: Frequency.nullable(), sensitivity: Frequency.nullable() }),
    frequencyResponse: FrequencyResponse.optional(),
    at: z.array(z.object({ frequency: Frequency, re: z.number(), im: z.number(), phaseDegrees: z.number() })),
    timeResponse: TimeResponse.nullable(),
    warnings: z.array(Warning),
  })
  .meta({ id: 'Analysis' });
export type Analysis = z.infer<typeof Analysis>;
