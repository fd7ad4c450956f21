import { z } from 'zod';

/** The ways a plant P(s)·e^(−sθ) is written down. Numbers are bounded here; meaning (proper, non-zero) is checked by the engine. */

const MAX_ORDER = 24;
const MAX_MAGNITUDE = 1e30;
const MAX_DEAD_TIME = 1e4;

const finite = (name: string) => z.number().refine((x) => Math.abs(x) <= MAX_MAGNITUDE, `${name} is a number of magnitude at most 1e30.`);

export const DeadTime = z
  .number()
  .min(0, 'Dead time is 0 or more.')
  .max(MAX_DEAD_TIME, 'Dead time is at most 10,000 s.')
  .meta({ description: 's' });

const polynomial = (name: string) =>
  z
    .array(finite('A coefficient'))
    .min(1, `${name} has at least one coefficient.`)
    .max(MAX_ORDER + 1, `${name} has at most ${MAX_ORDER + 1} coefficients.`)
    .refine((coefficients) => coefficients.some((c) => c !== 0), `${name} is not zero.`);

export const CoefficientsPlant = z
  .strictObject({
    kind: z.literal('coefficients'),
    numerator: polynomial('The numerator'),
    denominator: polynomial('The denominator'),
    deadTime: DeadTime.default(0),
  })
  .meta({ id: 'CoefficientsPlant', description: 'descending powers of s' });

export const ComplexNumber = z.strictObject({ re: finite('A real part'), im: finite('An imaginary part') }).meta({ id: 'ComplexNumber' });
export type ComplexNumber = z.infer<typeof ComplexNumber>;

const roots = (name: string) => z.array(ComplexNumber).max(MAX_ORDER, `At most ${MAX_ORDER} ${name}.`);

export const RootsPlant = z
  .strictObject({
    kind: z.literal('roots'),
    gain: finite('The gain').refine((k) => k !== 0, 'The gain is not zero.'),
    zeros: roots('zeros').default([]),
    poles: roots('poles').default([]),
    deadTime: DeadTime.default(0),
  })
  .meta({ id: 'RootsPlant', description: 'gain·Π(s − zero)/Π(s − pole), conjugates present' });

export const FormulaPlant = z
  .strictObject({
    kind: z.literal('formula'),
    text: z.string().trim().min(1, 'A formula in s.').max(500, 'A formula has at most 500 characters.'),
    parameters: z
      .record(
        z
          .string()
          .regex(/^[A-Za-z][A-Za-z0-9_]*$/, 'A parameter is named by letters, digits and _.')
          .max(40),
        finite('A parameter'),
      )
      .default({}),
  })
  .meta({ id: 'FormulaPlant', description: 'ordinary mathematics in s; other letters are named parameters' });

export const PlantModel = z.discriminatedUnion('kind', [CoefficientsPlant, RootsPlant, FormulaPlant]).meta({ id: 'PlantModel' });
export type PlantModel = z.infer<typeof PlantModel>;

export const ReadPlant = z.strictObject({ plant: PlantModel }).meta({ id: 'ReadPlant' });

/** A plant worked out once: factored as gain·Π(s − zero)/Π(s − pole)·e^(−s·deadTime), as coefficients, and in words. */
export const PlantReading = z
  .object({
    gain: z.number(),
    zeros: z.array(ComplexNumber),
    poles: z.array(ComplexNumber),
    deadTime: z.number().meta({ description: 's' }),
    numerator: z.array(z.number()),
    denominator: z.array(z.number()),
    factored: z.boolean().meta({
      description: 'true: zeros and poles are what was given, and the coefficients are multiplied out of them; false: the other way round',
    }),
    words: z.string(),
  })
  .meta({ id: 'PlantReading' });
export type PlantReading = z.infer<typeof PlantReading>;

export const Sensor = z
  .strictObject({
    timeConstant: z.number().min(0, 'A time constant is 0 or more.').max(MAX_DEAD_TIME).default(0),
    deadTime: DeadTime.default(0),
  })
  .meta({ id: 'Sensor', description: 'H(s) = e^(−s·deadTime)/(1 + s·timeConstant)' });
export type Sensor = z.infer<typeof Sensor>;
