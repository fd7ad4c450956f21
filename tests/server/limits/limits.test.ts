import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Limits, ProblemDetails, PutLimits } from '@/contract';
import { makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;
let at: string;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());
beforeEach(async () => {
  mine = await makeProject(ada);
  at = `${mine.at}/limits`;
});

const ms = { quantity: 'ms', bound: 'max', limit: 1.7, target: 1.6, source: 'team rule 4' } as const;
const put = (items: unknown, ifMatch = '"0"', client = ada) =>
  client.call<Limits & ProblemDetails>('PUT', at, { items }, { 'if-match': ifMatch });
const items = (parts: PutLimits['items'][number][]) => parts;

describe('limits', () => {
  it('are none at first, with an ETag to set them by', async () => {
    const { body, headers } = await ada.call<Limits>('GET', at);
    expect(body).toEqual({ items: [], updatedAt: null, updatedBy: null });
    expect(headers.get('etag')).toBe('"0"');
  });

  it('are kept with target and source, and say who set them', async () => {
    const phase = { quantity: 'phaseMargin', bound: 'min', limit: 45 };
    const { status, body, headers } = await put([ms, phase]);
    expect(status).toBe(200);
    expect(body).toEqual({
      items: [ms, { ...phase, target: null, source: '' }],
      updatedAt: expect.any(String),
      updatedBy: 'ada',
    });
    const read = await ada.call<Limits>('GET', at);
    expect(read.body).toEqual(body);
    expect(read.headers.get('etag')).toBe(headers.get('etag'));
  });

  it('of two people who save at once the second sees both', async () => {
    const [first, second] = await Promise.all([put([ms]), put([{ ...ms, limit: 2, target: null }])]);
    expect([first.status, second.status].sort()).toEqual([200, 412]);
    const [won, lost] = first.status === 200 ? [first, second] : [second, first];
    expect(lost.body.detail).toMatch(/changed this since you read it/);
    const { body, headers } = await ada.call<Limits>('GET', at);
    expect(body.items).toEqual(won.body.items);
    expect((await put([{ ...ms, limit: 1.8 }], headers.get('etag')!)).status).toBe(200);
  });

  it('cannot be replaced without saying which version was seen', async () => {
    expect((await ada.call('PUT', at, { items: [ms] })).status).toBe(428);
    await put([ms]);
    const stale = await put([]);
    expect(stale.status).toBe(412);
    expect(stale.headers.get('etag')).toBe('"1"');
  });

  it.each([
    ['a target outside its limit', items([{ ...ms, target: 1.8 }]), '/items/0/target'],
    ['a least target below its limit', items([{ quantity: 'phaseMargin', bound: 'min', limit: 45, target: 40 }]), '/items/0/target'],
    ['a bound that the quantity has not', items([{ ...ms, bound: 'min' }]), '/items/0/bound'],
    ['a quantity demanded twice', items([ms, { ...ms, limit: 1.8 }]), '/items/1/quantity'],
    [
      'a minimum above the maximum',
      items([
        { quantity: 'bandwidth', bound: 'min', limit: 4 },
        { quantity: 'bandwidth', bound: 'max', limit: 3 },
      ]),
      '/items/1/limit',
    ],
    ['a phase margin over 180°', items([{ quantity: 'phaseMargin', bound: 'min', limit: 181 }]), '/items/0/limit'],
    ['a gain margin below 0 dB', items([{ quantity: 'gainMargin', bound: 'min', limit: 0.9 }]), '/items/0/limit'],
    ['a reduction margin above 0 dB', items([{ quantity: 'gainReduction', bound: 'max', limit: 1.1 }]), '/items/0/limit'],
    ['a default target that no loop meets', items([{ quantity: 'ms', bound: 'max', limit: 1.05 }]), '/items/0/target'],
    ['a source of several lines', items([{ ...ms, source: 'a\nb' }]), '/items/0/source'],
  ])('refuse %s and keep what there was', async (_name, wrong, pointer) => {
    const { status, body } = await put(wrong);
    expect(status).toBe(422);
    expect(body.errors).toMatchObject([{ pointer }]);
    expect((await ada.call<Limits>('GET', at)).body.items).toEqual([]);
  });

  it.each([
    ['an unknown quantity', [{ ...ms, quantity: 'roll' }], 422],
    ['a limit in words', [{ ...ms, limit: '1.7' }], 400],
    ['an unknown field', [{ ...ms, unit: 'dB' }], 400],
    ['more than there are quantities', Array.from({ length: 21 }, () => ms), 422],
  ])('refuse %s', async (_name, wrong, expected) => expect((await put(wrong)).status).toBe(expected));

  it('take both bounds where the quantity has both', async () => {
    const both = items([
      { quantity: 'bandwidth', bound: 'min', limit: 2 },
      { quantity: 'bandwidth', bound: 'max', limit: 6 },
    ]);
    expect((await put(both)).status).toBe(200);
  });

  it('of someone else’s project are not there', async () => {
    const ben = await app
      .client('ben')
      .signUp()
      .catch(() => app.client('ben').signIn());
    expect((await ben.call('GET', at)).status).toBe(404);
    expect((await put([ms], '"0"', ben)).status).toBe(404);
  });
});
