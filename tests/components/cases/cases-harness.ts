import { judgeCases } from '@/analysis/project';
import type { Analysis, Case, Conditions, FrozenCase, KeptAnalysis, Limit } from '@/contract';
import { caseViews, type CaseView } from '@/components/cases/model/case-view';
import { anAnalysis } from '../../support/an-analysis';

/** Cases at 30, 40 and 80 km/h with two loads, and an analysis of them that is judged as the server would. */

export const kmh = (speed: number): number => speed / 3.6;
const uuid = (n: number) => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;
export const plantId = uuid(900);

export const limits: Limit[] = [
  { quantity: 'ms', bound: 'max', limit: 1.7, target: 1.6, source: 'team rule 4' },
  { quantity: 'phaseMargin', bound: 'min', limit: 45, target: 50, source: 'team rule 4' },
];

export function aCase(n: number, parts: Partial<Case> = {}): Case {
  return {
    id: uuid(n),
    name: `case ${n}`,
    plantId,
    plantRevision: null,
    parameters: {},
    axes: {},
    basis: 'extrapolated',
    etag: `"${n}"`,
    ...parts,
  };
}

/** 30, 40 and 80 km/h by 1,380 and 1,500 kg, in that order. */
export const sixCases: Case[] = [1380, 1500].flatMap((mass, r) =>
  [30, 40, 80].map((speed, c) =>
    aCase(10 * r + c + 1, {
      name: `${speed} km/h, ${mass} kg`,
      axes: { speed: kmh(speed), mass },
      basis: speed === 40 ? 'measured' : 'extrapolated',
    }),
  ),
);

export const frozen = ({ plantId: _plant, plantRevision: _revision, etag: _etag, ...kept }: Case, revision = 3): FrozenCase => ({
  ...kept,
  plant: {
    id: plantId,
    name: 'Watered asphalt',
    revision,
    plant: { kind: 'coefficients', numerator: [2.1], denominator: [0.35, 1, 0], deadTime: 0.08 },
    sensor: null,
    deadTimeBasis: 'measured',
    delayBudget: [],
    units: { input: 'kN·m', output: 'm/s' },
  },
});

export const conditionsOf = (cases: readonly Case[], changes: Partial<Conditions> = {}): Conditions => ({
  cases: cases.map((one) => frozen(one)),
  limits,
  operatingRange: [],
  ...changes,
});

export const withMs = (ms: number, phaseDegrees = 55): Analysis =>
  anAnalysis({ ms, margins: { phase: { degrees: phaseDegrees, frequency: 2.1 } } });

export const sixNumbers = [1.63, 1.51, 1.36, 1.56, 1.46, 1.32].map((ms) => withMs(ms));

/** What would be kept of these cases with these numbers. */
interface Kept extends Partial<Conditions> {
  /** null: nobody stated how the loop is sampled. */
  readonly sampling?: 'continuous' | null;
}

export function keptOf(
  cases: readonly Case[],
  numbers: readonly Analysis[],
  { sampling = 'continuous', ...changes }: Kept = {},
): KeptAnalysis {
  const conditions = conditionsOf(cases, changes);
  const { results, headline } = judgeCases({ sampling }, conditions, numbers);
  const controller = { form: 'parallel', kp: 1, ki: 0.4, kd: 0, derivativeFilterTime: 0, filters: [] };
  return {
    id: uuid(700),
    design: { id: uuid(800), name: 'Speed hold', revision: 7 },
    engineVersion: '1.0.0',
    contentHash: '0'.repeat(64),
    resultHash: '1'.repeat(64),
    createdAt: '2026-05-02T10:00:00.000Z',
    createdBy: 'Mira Castellan',
    verdict: headline.verdict,
    headline,
    room: null,
    caseCount: cases.length,
    plants: [{ id: plantId, name: 'Watered asphalt', revision: 3 }],
    inputs: {
      ...conditions,
      design: {
        id: uuid(800),
        name: 'Speed hold',
        revision: 7,
        controller,
        sampling,
        actuator: null,
      } as unknown as KeptAnalysis['inputs']['design'],
    },
    results,
  };
}

export const viewsOf = (cases: readonly Case[], numbers: readonly Analysis[], now = conditionsOf(cases)): CaseView[] =>
  caseViews(cases, now, keptOf(cases, numbers));
