import { CreatePlant, CreateProject } from '@/contract';
import { decibels, delay, least, most, oneCase, pid, vehicle, type DemoProject } from './demo-project';

export const rearAxleTorque: DemoProject = {
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
  cases: [
    oneCase('bus at its slowest', 'measured', { deadTime: 0.015 }),
    oneCase('warm motor', 'figures', { gainFactor: 1.1 }),
    oneCase('warm motor, bus at its slowest', 'extrapolated', { gainFactor: 1.1, deadTime: 0.015 }),
  ],
  limits: [
    most('ms', { limit: 1.7, target: 1.6 }, 'team rule 4'),
    least('phaseMargin', { limit: 45, target: 50 }, 'team rule 4'),
    least('gainMargin', { limit: decibels(6), target: decibels(7) }, 'team rule 4'),
    most('settlingTime', { limit: 0.8, target: null }, 'driver, after the first turn of the stand'),
  ],
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
