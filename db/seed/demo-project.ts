import { CreateCase, CreateGrid, Limit, OperatingRange, ParallelController, type CreatePlant, type CreateProject } from '@/contract';
import type { z } from 'zod';

/** Invented work on an invented electric test car. Every design is stated to be continuous, every dead time measured. */

export interface DemoRevision {
  readonly daysAgo: number;
  readonly note: string;
  readonly controller: z.output<typeof ParallelController>;
}

type DemoCase = Omit<z.output<typeof CreateCase>, 'plantId' | 'plantRevision'>;

export interface DemoProject {
  readonly project: z.output<typeof CreateProject>;
  readonly plant: z.output<typeof CreatePlant>;
  /** Beside the case “nominal” that the plant brings. */
  readonly cases?: readonly DemoCase[];
  /** In place of all other cases. */
  readonly grid?: z.output<typeof CreateGrid>['lists'];
  readonly limits?: z.output<typeof Limit>[];
  readonly operatingRange?: z.output<typeof OperatingRange>[];
  readonly design: { readonly name: string; readonly revisions: readonly DemoRevision[] };
  readonly daysAgo: number;
}

export const vehicle = 'Heron 14';

export const pid = (kp: number, ki: number, kd: number, { tf = 0, b = 1 } = {}) =>
  ParallelController.parse({
    form: 'parallel',
    kp,
    ki,
    kd,
    derivativeFilterTime: tf,
    setpointWeights: { proportional: b, derivative: 0 },
  });

export const delay = (source: string, nominal: number, worst: number) => ({
  source,
  nominal,
  worst,
  basis: 'measured' as const,
  included: true,
});

type Bounds = Pick<z.output<typeof Limit>, 'limit' | 'target'>;
const demand = (bound: 'min' | 'max') => (quantity: z.output<typeof Limit>['quantity'], bounds: Bounds, source: string) =>
  Limit.parse({ quantity, bound, ...bounds, source });
export const least = demand('min');
export const most = demand('max');

/** A gain of so many decibels as the factor that limits are kept in. */
export const decibels = (value: number) => 10 ** (value / 20);

export const oneCase = (name: string, basis: DemoCase['basis'], parameters: DemoCase['parameters']): DemoCase => ({
  name,
  basis,
  parameters,
  axes: {},
});
