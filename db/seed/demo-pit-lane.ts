import { CreatePlant, CreateProject } from '@/contract';
import { delay, oneCase, pid, vehicle, type DemoProject } from './demo-project';

export const pitLane: DemoProject = {
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
  cases: [
    oneCase('low fuel, driver alone', 'figures', { gainFactor: 1.08 }),
    oneCase('wheel speed at its slowest', 'extrapolated', { deadTime: 0.08 }),
  ],
  design: {
    name: 'Limiter',
    revisions: [
      { daysAgo: 20, note: 'PI alone, as a start.', controller: pid(1.2, 0.4, 0, { b: 0.8 }) },
      { daysAgo: 12, note: 'A little derivative, so that the gain can go up.', controller: pid(1.6, 0.7, 0.08, { tf: 0.02, b: 0.7 }) },
    ],
  },
  daysAgo: 21,
};
