import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { caseLoop } from '@/analysis/project';
import { analyseLoop } from '@/analysis';
import type { Case, Conditions, Judged, KeptAnalysis, PlantRevision, ProblemDetails, Recomputed } from '@/contract';
import { createLoopPool } from '@/server/jobs/loop-pool';
import { aDesign, aPlant, made, makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

const limits = [
  { quantity: 'ms', bound: 'max', limit: 2.2, target: 2.1, source: 'team rule' },
  { quantity: 'phaseMargin', bound: 'min', limit: 30, target: 35, source: 'team rule' },
];

let app: TestApp;
let ada: Client;
let mine: MadeProject;
let formula: PlantRevision;
let kept: KeptAnalysis;

beforeAll(async () => {
  app = await startTestApp({ replaced: { jobs: createLoopPool({ timeoutMs: 60_000 }) } });
  ada = await app.client('ada').signUp();
  mine = await makeProject(ada);
  formula = await made<PlantRevision>(ada, `${mine.at}/plants`, {
    ...aPlant,
    name: 'By mass',
    plant: { kind: 'formula', text: '3.15*exp(-0.08*s)/(m*s*(0.35*s+1))', parameters: { m: 1.5 } },
  });
  const lists = [
    { axis: 'speed', points: [{ at: 10, parameters: { deadTime: 0.14 } }, { at: 20 }] },
    {
      axis: 'mass',
      points: [
        { at: 1380, parameters: { m: 1.38 } },
        { at: 1640, parameters: { m: 1.64 } },
      ],
    },
  ];
  await made(ada, `${mine.at}/cases/grid`, { plantId: formula.id, lists, replace: true });
  await ada.call('PUT', `${mine.at}/limits`, { items: limits }, { 'if-match': '"0"' });
  kept = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id });
});
afterAll(() => app.close());

const get = async <Body>(path: string) => (await ada.call<Body>('GET', `${mine.at}${path}`)).body;
const projectNow = async () => {
  const { body, headers } = await ada.call<{ operatingRange: unknown[] }>('GET', mine.at);
  return { body, etag: headers.get('etag')! };
};
const declare = async (operatingRange: unknown[]) =>
  ada.call<ProblemDetails>('PATCH', mine.at, { operatingRange }, { 'if-match': (await projectNow()).etag });
const end = (axis: string, lowIsPhysical: boolean, highIsPhysical: boolean) => ({ axis, lowIsPhysical, highIsPhysical });

describe('an analysis over cases', () => {
  it('computes a formula anew with each case’s own parameters, frozen with what it reads as', () => {
    const [light] = kept.inputs.cases;
    expect(light).toMatchObject({ parameters: { m: 1.38, deadTime: 0.14 }, plant: { plant: { parameters: { m: 1.38 } } } });
    const loop = {
      ...caseLoop(light, kept.inputs.design),
      plant: { kind: 'coefficients' as const, numerator: [3.15], denominator: [0.35 * 1.38, 1.38, 0], deadTime: 0.14 },
    };
    expect(kept.results[0].numbers.sensitivity.ms.value).toBeCloseTo(analyseLoop(loop).sensitivity.ms.value, 9);
  });

  it('judges every case against the limits as they were, and names the worst', () => {
    expect(kept.inputs.limits).toEqual(limits);
    const worst = kept.results.reduce((a, b) => (b.numbers.sensitivity.ms.value > a.numbers.sensitivity.ms.value ? b : a));
    expect(worst.case.name).toBe('36 km/h, 1,380 kg');
    expect(kept.headline.case).toEqual(worst.case);
    expect(kept.results.every(({ checks }) => checks.length === 2)).toBe(true);
  });

  it('is capped at tight at the edge of what was checked, until both ends are declared physical', async () => {
    expect(kept).toMatchObject({ verdict: 'tight', headline: { capped: true, verdict: 'tight' } });
    expect(kept.headline.edges).toEqual([
      { axis: 'speed', end: 'low', physical: false },
      { axis: 'mass', end: 'low', physical: false },
    ]);
    const judge = async () => (await ada.call<Judged>('POST', `${mine.at}/judge`, aDesignContent)).body;
    await declare([end('speed', true, false)]);
    expect(await judge()).toMatchObject({ verdict: 'tight', headline: { capped: true } });
    await declare([end('speed', false, true), end('mass', true, true)]);
    expect(await judge()).toMatchObject({ verdict: 'tight', headline: { capped: true } });
    await declare([end('speed', true, false), end('mass', true, false)]);
    expect(await judge()).toMatchObject({ verdict: 'pass', headline: { capped: false } });
    expect((await get<KeptAnalysis>(`/analyses/${kept.id}`)).inputs.operatingRange).toEqual([]);
  });

  it('has another hash once an end was declared', async () => {
    await declare([]);
    const before = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id });
    expect(before.contentHash).toBe(kept.contentHash);
    await declare([end('speed', true, false)]);
    const after = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id });
    expect(after.contentHash).not.toBe(kept.contentHash);
    expect(after.resultHash).toBe(kept.resultHash);
  });

  it('tells the room that is left, and a design turned past it fails the named limit in the named case', async () => {
    const first = kept.room!.moreGain.any!;
    const turned = (factor: number) => ({
      ...aDesignContent,
      controller: { ...aDesign.controller, kp: 1.2 * factor, ki: 0.4 * factor, kd: 0.1 * factor },
    });
    const judge = async (factor: number) => (await ada.call<Judged>('POST', `${mine.at}/judge`, turned(factor))).body;
    expect((await judge(first.amount)).results.every(({ verdict }) => verdict !== 'fail')).toBe(true);
    const past = await judge(first.amount + 0.011);
    const failed = past.results.flatMap((result) =>
      result.checks.filter(({ verdict }) => verdict === 'fail').map(({ quantity }) => [result.case.name, quantity]),
    );
    expect(failed).toContainEqual([first.case.name, first.quantity]);
  });

  it('may be over some of the cases', async () => {
    const cases = await get<{ items: Case[] }>('/cases');
    const some = cases.items.slice(2).map(({ id }) => id);
    const { results } = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id, caseIds: some });
    expect(results.map((result) => result.case.id)).toEqual(some);
    const stranger = { designId: mine.design.id, caseIds: [crypto.randomUUID()] };
    expect((await ada.call('POST', `${mine.at}/analyses`, stranger)).status).toBe(404);
  });

  it('comes out the same when it is recomputed', async () => {
    expect((await ada.call<Recomputed>('POST', `${mine.at}/analyses/${kept.id}/recompute`, {})).body.same).toBe(true);
  });

  it('is judged by the page on the very conditions that the server would freeze', async () => {
    const conditions = await get<Conditions>('/conditions');
    expect(conditions.cases).toEqual(kept.inputs.cases);
    expect(conditions.limits).toEqual(kept.inputs.limits);
  });
});

const { name: _name, ...aDesignContent } = aDesign;

describe('judging without keeping', () => {
  it('leaves time responses out unless they are wanted or a limit needs them', async () => {
    const judge = async (parts: object) => (await ada.call<Judged>('POST', `${mine.at}/judge`, { ...aDesignContent, ...parts })).body;
    expect((await judge({})).results[0].numbers.timeResponse).toBeNull();
    expect((await judge({ parts: 'all' })).results[0].numbers.timeResponse).not.toBeNull();
    const etag = (await ada.call('GET', `${mine.at}/limits`)).headers.get('etag')!;
    const settling = { quantity: 'settlingTime', bound: 'max', limit: 12 };
    await ada.call('PUT', `${mine.at}/limits`, { items: [...limits, settling] }, { 'if-match': etag });
    const judged = await judge({ room: true });
    expect(judged.results[0].checks[2]).toMatchObject({ quantity: 'settlingTime', verdict: 'pass', value: expect.any(Number) });
    expect(judged.room).toMatchObject({ lessGain: { any: { quantity: 'settlingTime' } } });
  });

  it('refuses what the engine refuses, naming the case', async () => {
    const improper = {
      ...aDesignContent,
      controller: { form: 'parallel', kp: 1, filters: [{ kind: 'leadLag', zeroTime: 1, poleTime: 0 }] },
    };
    expect((await ada.call('POST', `${mine.at}/judge`, improper)).status).toBe(422);
  });

  it('is not for strangers', async () => {
    const ben = await app.client('ben').signUp();
    expect((await ben.call('POST', `${mine.at}/judge`, aDesignContent)).status).toBe(404);
    expect((await ben.call('GET', `${mine.at}/conditions`)).status).toBe(404);
  });
});

describe('the operating range', () => {
  it.each([
    ['one axis twice', [end('speed', true, true), end('speed', true, true)], '/operatingRange/1/axis'],
    ['a loop that takes up lower than it lets go', [{ ...end('speed', true, true), engage: 5, disengage: 8 }], '/operatingRange/0/engage'],
  ])('refuses %s', async (_what, range, pointer) => {
    const { status, body } = await declare(range);
    expect([status, body.errors]).toMatchObject([422, [{ pointer }]]);
  });
});
