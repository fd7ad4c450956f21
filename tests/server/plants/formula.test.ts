import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Analysis, DesignRevision, KeptAnalysis, PlantReading, PlantRevision, Project, Recomputed } from '@/contract';
import { aDesign, aPlant, made } from '../../support/a-project';
import type { Client } from '../../support/client';
import { startTestApp, type TestApp } from '../../support/test-app';

const plant = { kind: 'formula', text: 'k exp(-0.08 s)/(s (0.35 s + 1))', parameters: { k: 2.1 } };
const { name: _name, ...content } = aPlant;

let app: TestApp;
let ada: Client;
let at: string;
let kept: PlantRevision;
let design: DesignRevision;
let reading: PlantReading;
beforeAll(async () => {
  app = await startTestApp();
  ada = await app.client('ada').signUp();
  const project = await made<Project>(ada, '/api/projects', { name: 'Formula' });
  at = `/api/projects/${project.id}`;
  kept = await made<PlantRevision>(ada, `${at}/plants`, { ...aPlant, plant });
  design = await made<DesignRevision>(ada, `${at}/designs`, aDesign);
  reading = (await ada.call<PlantReading>('POST', '/api/plants/read', { plant })).body;
});
afterAll(() => app.close());

describe('a plant given as a formula', () => {
  it('is worked out once: factored, with its dead time', () => {
    expect(reading).toMatchObject({ factored: true, deadTime: 0.08, zeros: [], poles: [{ re: 0, im: 0 }, { re: -1 / 0.35, im: 0 }] }); // prettier-ignore
    expect(reading.gain).toBeCloseTo(6, 12);
  });

  it('is kept as it was written, with what it reads as beside it', async () => {
    expect(kept).toMatchObject({ plant, reading });
    const revision = await made<PlantRevision>(ada, `${at}/plants/${kept.id}/revisions`, {
      ...content,
      plant: { kind: 'formula', text: '1/(s + 2)' },
      baseRevision: 1,
    });
    expect(revision.reading).toMatchObject({ factored: false, numerator: [1], denominator: [1, 2] });
    expect((await ada.call<PlantRevision>('GET', `${at}/plants/${kept.id}/revisions/1`)).body).toEqual(kept);
  });

  it('gives the same numbers as its roots do, without a parser', async () => {
    const { gain, zeros, poles, deadTime } = reading;
    const ask = async (given: object) =>
      (await ada.call<Analysis>('POST', '/api/loops/analyse?curves=false', { plant: given, controller: design.controller })).body;
    expect(await ask(plant)).toEqual(await ask({ kind: 'roots', gain, zeros, poles, deadTime }));
  });

  it('is frozen with its reading, and recomputes to the same numbers', async () => {
    const analysis = await made<KeptAnalysis>(ada, `${at}/analyses`, { designId: design.id });
    const [{ plant: frozen }] = analysis.inputs.cases;
    expect(frozen.reading).toBeDefined();
    const { body } = await ada.call<Recomputed>('POST', `${at}/analyses/${analysis.id}/recompute`);
    expect(body).toMatchObject({ same: true, differences: [] });
  });
});

describe('a formula that has no meaning', () => {
  it.each([
    [
      'a bracket that is not closed',
      '2.1 exp(-0.08 s)/(s (0.35 s + 1)',
      /^A bracket is open at character 18\. Close it, or take it out\.$/,
    ],
    ['a letter without a value', '1/(tau s + 1)', /^Character 4: “tau”/],
    ['a function that is none', 'sqrt(s)/(s + 1)', /^Character 1:/],
    ['two dead times in a sum', 'exp(-s)/(s + 1) + exp(-2 s)/(s + 1)', /^Character 17:.*dead time/],
    ['a dead time that looks ahead', 'exp(s)/(s + 1)', /^Character 1:/],
  ])('%s is refused at its character, wherever it is entered', async (_what, text, detail) => {
    const wrong = { kind: 'formula', text };
    for (const [path, body] of [
      ['/api/plants/read', { plant: wrong }],
      [`${at}/plants`, { ...aPlant, plant: wrong }],
      [`${at}/plants/${kept.id}/revisions`, { ...content, plant: wrong, baseRevision: 2 }],
      ['/api/loops/analyse', { plant: wrong, controller: { form: 'parallel', kp: 1 } }],
    ] as const) {
      const reply = await ada.call('POST', path, body);
      expect(reply).toMatchObject({ status: 422, body: { errors: [{ pointer: '/plant/text', detail: expect.stringMatching(detail) }] } });
    }
  });
});
