import { CreatePlant, CreateProject, ParallelController } from '@/contract';
import type { z } from 'zod';

/** Invented work on an invented electric test car. Every design is stated to be continuous, every dead time measured. */

export interface DemoRevision {
  readonly daysAgo: number;
  readonly note: string;
  readonly controller: z.output<typeof ParallelController>;
}

export interface DemoProject {
  readonly project: z.output<typeof CreateProject>;
  readonly plant: z.output<typeof CreatePlant>;
  readonly design: { readonly name: string; readonly revisions: readonly DemoRevision[] };
  readonly daysAgo: number;
}

const vehicle = 'Heron 14';

const pid = (kp: number, ki: number, kd: number, { tf = 0, b = 1 } = {}) =>
  ParallelController.parse({
    form: 'parallel',
    kp,
    ki,
    kd,
    derivativeFilterTime: tf,
    setpointWeights: { proportional: b, derivative: 0 },
  });

const delay = (source: string, nominal: number, worst: number) => ({ source, nominal, worst, basis: 'measured' as const, included: true });

const rearAxleTorque: DemoProject = {
  project: CreateProject.parse({
    name: 'Rear-axle torque loop',
    vehicle,
    description: 'Holds the delivered axle torque on its request without waking the half-shafts, which ring near 7 Hz.',
  }),
  // A 18 ms current loop times the half-shafts: a dip at 38 rad/s and a peak at 46 rad/s, with a gain of 1 at rest.
  plant: CreatePlant.parse({
    name: 'Inverter, motor and half-shafts',
    plant: {
      kind: 'coefficients',
      numerator: [2116, 19297.92, 3055504],
      denominator: [25.992, 1587.47904, 62970.1248, 3055504],
      deadTime: 0.012,
    },
    deadTimeBasis: 'measured',
    delayBudget: [delay('torque request over the bus', 0.007, 0.01), delay('inverter computation', 0.005, 0.005)],
    units: { input: 'N·m', output: 'N·m' },
    note: 'From a sine sweep on the stand, half-shafts loaded by the brake.',
  }),
  design: {
    name: 'Torque hold',
    revisions: [
      { daysAgo: 33, note: 'Slow and safe, for the first turn of the stand.', controller: pid(0.05, 4, 0) },
      { daysAgo: 31, note: 'Nearly twice the integral; the half-shafts stay quiet.', controller: pid(0.1, 7, 0) },
      { daysAgo: 26, note: 'What the driver asked for: torque there within half a second.', controller: pid(0.12, 8.5, 0) },
    ],
  },
  daysAgo: 34,
};

const pitLane: DemoProject = {
  project: CreateProject.parse({
    name: 'Pit-lane limiter',
    vehicle,
    description: 'Holds 60 km/h between the lines, from any speed the car comes in with.',
  }),
  plant: CreatePlant.parse({
    name: 'Dry pit lane, 60 km/h',
    plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.12, 1.00138, 0.0115], deadTime: 0.05 },
    deadTimeBasis: 'measured',
    delayBudget: [delay('wheel-speed average', 0.02, 0.04), delay('bus', 0.01, 0.02), delay('torque path', 0.02, 0.02)],
    units: { input: 'kN·m', output: 'm/s' },
    note: 'Torque loop closed, tyres cold.',
  }),
  design: {
    name: 'Limiter',
    revisions: [
      { daysAgo: 20, note: 'PI alone, as a start.', controller: pid(1.2, 0.4, 0, { b: 0.8 }) },
      { daysAgo: 12, note: 'A little derivative, so that the gain can go up.', controller: pid(1.6, 0.7, 0.08, { tf: 0.02, b: 0.7 }) },
    ],
  },
  daysAgo: 21,
};

const speedHold: DemoProject = {
  project: CreateProject.parse({
    name: 'Wet-track speed hold',
    vehicle,
    description: 'Holds a steady speed on the watered handling track while the tyres are compared.',
  }),
  plant: CreatePlant.parse({
    name: 'Watered asphalt, 80 km/h',
    plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1.00672, 0.0192], deadTime: 0.08 },
    deadTimeBasis: 'measured',
    delayBudget: [delay('speed message age', 0.02, 0.04), delay('bus and gateway', 0.02, 0.03), delay('torque path', 0.04, 0.05)],
    units: { input: 'kN·m', output: 'm/s' },
    note: 'Torque steps of ±5 % around 80 km/h, three runs each way.',
  }),
  design: {
    name: 'Speed hold',
    revisions: [
      { daysAgo: 9, note: 'As it ran on the last wet day.', controller: pid(0.8, 0.25, 0.22, { tf: 0.05, b: 0.65 }) },
      { daysAgo: 5, note: 'Half-way to what the tyre people want.', controller: pid(0.95, 0.34, 0.26, { tf: 0.04, b: 0.6 }) },
      {
        daysAgo: 2,
        note: 'Recovers sooner from a gust; the filter follows the new message rate.',
        controller: pid(1.05, 0.42, 0.3, { tf: 0.035, b: 0.6 }),
      },
    ],
  },
  daysAgo: 10,
};

/** The oldest first, so that the newest stands on top of the list. */
export const demoProjects: readonly DemoProject[] = [rearAxleTorque, pitLane, speedHold];
