import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Activity, Analysis, AnalysisSummary, Case, KeptAnalysis, Recomputed } from '@/contract';
import { aDesign, aPlant, makeProject, made, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;
let kept: KeptAnalysis;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
  mine = await makeProject(ada);
  kept = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id });
});
afterAll(() => app.close());

const read = async <Body>(path: string) => (await ada.call<Body>('GET', path)).body;
const { name: _plantName, ...plantContent } = aPlant;
const { name: _designName, ...designContent } = aDesign;

describe('a kept analysis', () => {
  it('holds the whole content of what it used, its numbers and no curves', () => {
    const [result] = kept.results;
    expect(kept.inputs.design).toMatchObject({
      id: mine.design.id,
      revision: 1,
      controller: mine.design.controller,
      sampling: 'continuous',
    });
    expect(kept.inputs.cases[0]).toMatchObject({ name: 'nominal', plant: { id: mine.plant.id, revision: 1, plant: mine.plant.plant } });
    expect(kept.plants).toEqual([{ id: mine.plant.id, name: 'Watered asphalt', revision: 1 }]);
    expect(result).toMatchObject({ case: { name: 'nominal' }, verdict: 'notJudged', reason: 'No limits are set.', checks: [] });
    expect(result.numbers.frequencyResponse).toBeUndefined();
    expect(result.numbers.timeResponse).not.toHaveProperty('reference');
    expect(kept).toMatchObject({
      verdict: 'notJudged',
      caseCount: 1,
      room: { moreGain: { any: null, stability: null, instability: { amount: 11.68, case: { name: 'nominal' } } } },
      createdBy: 'ada',
      engineVersion: result.numbers.engineVersion,
    });
  });

  it('gives the case’s curves again from what was frozen, with the kept numbers', async () => {
    const { case: nominal, numbers } = kept.results[0];
    const whole = await read<Analysis>(`${mine.at}/analyses/${kept.id}/cases/${nominal.id}`);
    const { frequencyResponse, timeResponse, ...rest } = whole;
    expect({ ...rest, timeResponse: { metrics: timeResponse!.metrics } }).toEqual(numbers);
    expect(Math.max(...frequencyResponse!.sensitivity)).toBeCloseTo(numbers.sensitivity.ms.value, 3);
    expect(timeResponse!.reference!.time.length).toBeGreaterThanOrEqual(1000);
  });

  it('comes out the same when it is recomputed', async () => {
    const { body } = await ada.call<Recomputed>('POST', `${mine.at}/analyses/${kept.id}/recompute`, {});
    expect(body).toEqual({ same: true, engineVersion: kept.engineVersion, resultHash: kept.resultHash, differences: [] });
  });

  it('has the hashes of its content: the same for the same inputs, others for others', async () => {
    const again = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id, designRevision: 1 });
    expect([again.contentHash, again.resultHash]).toEqual([kept.contentHash, kept.resultHash]);
    expect(kept.contentHash).toMatch(/^[0-9a-f]{64}$/);
    const controller = { ...aDesign.controller, kp: 1.2000000000000002 };
    const other = await made<{ analysis: KeptAnalysis }>(ada, `${mine.at}/designs/${mine.design.id}/revisions`, {
      ...designContent,
      controller,
      baseRevision: 1,
      analyse: true,
    });
    expect(other.analysis.contentHash).not.toBe(kept.contentHash);
    expect(other.analysis.resultHash).not.toBe(kept.resultHash);
  });

  it('stays as it was when its plant and design move on', async () => {
    const { at, plant, design } = await makeProject(ada, 'Moving on');
    const first = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id });
    const slower = { ...plantContent, plant: { ...aPlant.plant, deadTime: 0.2 } };
    await made(ada, `${at}/plants/${plant.id}/revisions`, { ...slower, baseRevision: 1 });
    expect(await read(`${at}/analyses/${first.id}`)).toEqual(first);
    expect((await ada.call<Recomputed>('POST', `${at}/analyses/${first.id}/recompute`)).body.same).toBe(true);
    const second = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id });
    expect(second.plants[0].revision).toBe(2);
    expect(second.headline.value!).toBeGreaterThan(first.headline.value!);
  });

  it('cannot be changed, not even by SQL', async () => {
    expect(() => app.db.run(`update analysis set verdict = 'pass'`)).toThrow();
    for (const method of ['PUT', 'PATCH', 'DELETE'])
      expect((await ada.call(method, `${mine.at}/analyses/${kept.id}`, {})).status).toBeGreaterThanOrEqual(404);
    expect(await read(`${mine.at}/analyses/${kept.id}`)).toEqual(kept);
  });

  it('would be told from a result that had changed', async () => {
    const { at, design } = await makeProject(ada, 'Tampered');
    const honest = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id });
    app.db.run('drop trigger analysis_is_immutable');
    app.db.run(
      `update analysis set result_hash = 'x', results = json_replace(results, '$[0].numbers.sensitivity.ms.value', 1.1) where id = '${honest.id}'`,
    );
    const { body } = await ada.call<Recomputed>('POST', `${at}/analyses/${honest.id}/recompute`);
    expect(body).toMatchObject({ same: false, resultHash: honest.resultHash });
    expect(body.differences).toEqual([{ case: 'nominal', quantity: 'sensitivity.ms.value', kept: 1.1, now: honest.headline.value }]);
  });
});

describe('what is analysed', () => {
  it('says why it is not judged where nobody stated the sample time or the dead time', async () => {
    const { at } = await makeProject(ada, 'Unstated');
    const silent = await made<{ id: string }>(ada, `${at}/designs`, { ...aDesign, sampling: null });
    const { headline } = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: silent.id });
    expect(headline).toMatchObject({ verdict: 'notJudged', reason: 'Nobody stated the sample time. No limits are set.' });
  });

  it('fails where a case is unstable, with the case and without a number', async () => {
    const { at } = await makeProject(ada, 'Too much gain');
    const wild = await made<{ id: string }>(ada, `${at}/designs`, { ...aDesign, controller: { form: 'parallel', kp: 40 } });
    const { verdict, headline } = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: wild.id });
    expect(verdict).toBe('fail');
    expect(headline).toMatchObject({
      quantity: 'ms',
      value: null,
      verdict: 'fail',
      unstableCases: 1,
      case: { name: 'nominal' },
      reason: null,
    });
  });

  it('is refused with 404 for a design, revision or case that is not in the project', async () => {
    const other = await makeProject(ada, 'Other');
    const cases = await read<{ items: Case[] }>(`${other.at}/cases`);
    const path = `${mine.at}/analyses`;
    const bodies = [
      { designId: other.design.id },
      { designId: mine.design.id, designRevision: 99 },
      { designId: mine.design.id, caseIds: [cases.items[0].id] },
    ];
    for (const body of bodies) expect((await ada.call('POST', path, body)).status).toBe(404);
    expect((await ada.call('GET', `${other.at}/analyses/${kept.id}`)).status).toBe(404);
    expect((await ada.call('POST', `${other.at}/analyses/${kept.id}/recompute`)).status).toBe(404);
    expect((await ada.call('GET', `${mine.at}/analyses/${kept.id}/cases/${cases.items[0].id}`)).status).toBe(404);
    expect((await ada.call('GET', `${mine.at}/analyses/not-an-id`)).status).toBe(404);
  });

  it('takes the cases that are named', async () => {
    const { items } = await read<{ items: Case[] }>(`${mine.at}/cases`);
    const chosen = await made<KeptAnalysis>(ada, `${mine.at}/analyses`, { designId: mine.design.id, caseIds: [items[0].id] });
    expect(chosen.results.map((result) => result.case.id)).toEqual([items[0].id]);
    expect((await ada.call('POST', `${mine.at}/analyses`, { designId: mine.design.id, caseIds: [] })).status).toBe(422);
  });
});

describe('the list and the history', () => {
  it('list analyses without inputs and results, newest first, each once', async () => {
    const { at, design } = await makeProject(ada, 'Many');
    const ids: string[] = [];
    for (let i = 0; i < 5; i += 1) ids.unshift((await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id })).id);
    const first = await read<{ items: AnalysisSummary[]; nextCursor: string }>(`${at}/analyses?limit=3`);
    const second = await read<{ items: AnalysisSummary[]; nextCursor: null }>(`${at}/analyses?limit=3&cursor=${first.nextCursor}`);
    expect([...first.items, ...second.items].map(({ id }) => id)).toEqual(ids);
    expect(second.nextCursor).toBeNull();
    expect(first.items[0]).not.toHaveProperty('inputs');
    expect(first.items[0]).not.toHaveProperty('results');
  });

  it('tell who did what, newest first', async () => {
    const { at, design } = await makeProject(ada, 'History');
    await made(ada, `${at}/designs/${design.id}/revisions`, { ...designContent, note: 'as driven', baseRevision: 1, analyse: true });
    const { items } = await read<{ items: Activity[] }>(`${at}/activity`);
    expect(items.map(({ action, by }) => [action, by])).toEqual([
      ['design.revised', 'ada'],
      ['design.created', 'ada'],
      ['plant.created', 'ada'],
      ['project.created', 'ada'],
    ]);
    expect(items[0]).toMatchObject({
      summary: 'changed the design Speed hold to revision 2 and analysed it over one case',
      detail: 'as driven',
    });
  });
});
