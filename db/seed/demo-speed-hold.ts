import { CreatePlant, CreateProject } from '@/contract';
import { decibels, delay, least, most, pid, vehicle, type DemoProject } from './demo-project';

const KMH = 1 / 3.6;

/** A wheel gives so many pulses a turn, so the age of a speed grows as the car slows. */
const atSpeed = (kmh: number, deadTime: number, basis: 'measured' | 'figures' | 'extrapolated') => ({
  at: kmh * KMH,
  parameters: { deadTime },
  basis,
});

const TESTED_MASS = 1500;
/** The same torque moves a lighter car more. */
const atMass = (mass: number, basis: 'measured' | 'figures') => ({
  at: mass,
  parameters: { gainFactor: Math.round((TESTED_MASS / mass) * 1000) / 1000 },
  basis,
});

export const speedHold: DemoProject = {
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
  grid: [
    {
      axis: 'speed',
      points: [
        atSpeed(30, 0.194, 'extrapolated'),
        atSpeed(40, 0.148, 'measured'),
        atSpeed(60, 0.103, 'figures'),
        atSpeed(80, 0.08, 'measured'),
        atSpeed(100, 0.066, 'figures'),
        atSpeed(130, 0.054, 'measured'),
      ],
    },
    { axis: 'mass', points: [atMass(1380, 'figures'), atMass(1440, 'figures'), atMass(TESTED_MASS, 'measured'), atMass(1640, 'figures')] },
  ],
  limits: [
    most('ms', { limit: 1.7, target: 1.6 }, 'team rule 4'),
    least('phaseMargin', { limit: 45, target: 50 }, 'team rule 4'),
    least('gainMargin', { limit: decibels(6), target: decibels(7) }, 'team rule 4'),
    least('delayMargin', { limit: 0.2, target: null }, 'team rule 4'),
    most('settlingTime', { limit: 6, target: null }, 'driver, after the last wet day'),
    most('overshootPercent', { limit: 5, target: null }, 'driver, after the last wet day'),
  ],
  operatingRange: [
    { axis: 'speed', engage: 35 * KMH, disengage: 30 * KMH, lowIsPhysical: true, highIsPhysical: false },
    { axis: 'mass', engage: null, disengage: null, lowIsPhysical: true, highIsPhysical: false },
  ],
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
