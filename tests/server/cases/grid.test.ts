import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Case, CreateGrid, ProblemDetails } from '@/contract';
import { makeProject, type MadeProject } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

let app: TestApp;
let ada: Client;
let mine: MadeProject;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
});
afterAll(() => app.close());
beforeEach(async () => {
  mine = await makeProject(ada);
});

const addGrid = (parts: Partial<CreateGrid> & Record<string, unknown>) =>
  ada.call<{ items: Case[] } & ProblemDetails>('POST', `${mine.at}/cases/grid`, { plantId: mine.plant.id, ...parts });
const list = async () => (await ada.call<{ items: Case[] }>('GET', `${mine.at}/cases?limit=200`)).body.items;
const points = (count: number) => Array.from({ length: count }, (_, at) => ({ at: at + 1 }));

const speed = {
  axis: 'speed',
  points: [
    { at: 25 / 3, parameters: { deadTime: 0.17, gainFactor: 0.9 }, basis: 'measured' },
    { at: 100 / 3.6, parameters: { deadTime: 0.06 }, basis: 'measured' },
  ],
} as const;
const mass = {
  axis: 'mass',
  points: [
    { at: 1380, parameters: { gainFactor: 1.1 }, basis: 'figures' },
    { at: 1500, basis: 'measured' },
  ],
} as const;

describe('a grid of cases', () => {
  it('is every combination: names from the points, gain factors multiplied, known as badly as its worst point', async () => {
    const { status, body } = await addGrid({ lists: [speed, mass] as never });
    expect(status).toBe(201);
    expect(body.items.map(({ name, basis }) => [name, basis])).toEqual([
      ['30 km/h, 1,380 kg', 'figures'],
      ['30 km/h, 1,500 kg', 'measured'],
      ['100 km/h, 1,380 kg', 'figures'],
      ['100 km/h, 1,500 kg', 'measured'],
    ]);
    expect(body.items[0].parameters).toEqual({ deadTime: 0.17, gainFactor: 0.9 * 1.1 });
    expect(body.items[3]).toMatchObject({ parameters: { deadTime: 0.06 }, axes: { speed: 100 / 3.6, mass: 1500 } });
    expect(await list()).toHaveLength(5);
  });

  it('takes the place of all others where it is told to', async () => {
    await addGrid({ lists: [mass] as never, replace: true });
    expect((await list()).map(({ name }) => name)).toEqual(['1,380 kg', '1,500 kg']);
  });

  it('of 10,000 is refused at once, with how many are allowed', async () => {
    const { status, body } = await addGrid({
      lists: [
        { axis: 'speed', points: points(100) },
        { axis: 'mass', points: points(100) },
      ],
    });
    expect([status, body.errors]).toEqual([422, [{ pointer: '/lists', detail: 'This grid has 10,000 cases; at most 400 are allowed.' }]]);
    expect(await list()).toHaveLength(1);
  });

  it('counts the cases that there are', async () => {
    const { status, body } = await addGrid({
      lists: [
        { axis: 'speed', points: points(20) },
        { axis: 'mass', points: points(20) },
      ],
    });
    expect([status, body.errors?.[0].pointer, body.detail]).toEqual([422, '/lists', expect.stringContaining('399 fit')]);
    expect(await list()).toHaveLength(1);
  });

  it.each([
    [
      'two lists that set the same dead time',
      [speed, { axis: 'mass', points: [{ at: 1500, parameters: { deadTime: 1 } }] }],
      '/lists/1/points/0/parameters/deadTime',
    ],
    [
      'a parameter that the plant has not',
      [{ axis: 'mass', points: [{ at: 1500, parameters: { m: 1 } }] }],
      '/lists/0/points/0/parameters/m',
    ],
    ['one axis twice', [mass, mass], '/lists/1/axis'],
    ['one point twice', [{ axis: 'mass', points: [{ at: 1500 }, { at: 1500 }] }], '/lists/0/points/1/at'],
    ['a mass of nothing', [{ axis: 'mass', points: [{ at: 0 }] }], '/lists/0/points/0/at'],
    ['an empty list', [{ axis: 'mass', points: [] }], '/lists/0/points'],
    ['no list', [], '/lists'],
  ])('is refused for %s, and nothing of it is kept', async (_name, lists, pointer) => {
    const { status, body } = await addGrid({ lists: lists as never });
    expect([status, body.errors]).toMatchObject([422, [{ pointer }]]);
    expect(await list()).toHaveLength(1);
  });

  it('stands on a plant of the project, at a revision that there is', async () => {
    expect((await addGrid({ lists: [mass] as never, plantRevision: 2 })).body.errors).toMatchObject([{ pointer: '/plantRevision' }]);
    expect((await addGrid({ lists: [mass] as never, plantId: crypto.randomUUID() })).status).toBe(404);
  });
});
