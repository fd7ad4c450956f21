import { describe, expect, it } from 'vitest';
import { benchSubject, type Wanted, wantedBy } from '@/components/bench/subject/bench-subject';
import { benchLink } from '@/components/bench/subject/bench-link';
import type { Case, DesignRevision, KeptAnalysis, PlantRevision, Project } from '@/contract';

const project = { id: 'p' } as Project;
const plant = { id: 'plant', revision: 3 } as PlantRevision;
const nominal = { id: 'nominal', name: 'nominal', plantId: 'plant', plantRevision: null, parameters: {} } as Case;
const heavy = { ...nominal, id: 'heavy', name: 'heavy' };
const design = (id: string, revision: number, createdAt: string) => ({ id, revision, createdAt }) as DesignRevision;
const older = design('older', 2, '2026-05-01');
const newer = design('newer', 6, '2026-05-02');

const subject = (wanted: Wanted, changes: Partial<Parameters<typeof benchSubject>[0]> = {}) =>
  benchSubject(
    {
      project,
      plants: [plant],
      cases: [nominal, heavy],
      designs: [older, newer],
      analysis: null,
      openedRevision: null,
      plantRevision: null,
      ...changes,
    },
    wanted,
  );

describe('what lies on the bench', () => {
  it('is the design that was kept last, in the first case', () => {
    expect(subject({})).toMatchObject({ opened: newer, latest: newer, pinned: false, shownCase: nominal, plant });
  });

  it('is the design and case that the address names', () => {
    expect(subject({ design: 'older', caseId: 'heavy' })).toMatchObject({ latest: older, shownCase: heavy });
  });

  it('is an older revision where the address pins it, beside the newest', () => {
    const third = design('newer', 3, '2026-04-01');
    expect(subject({ design: 'newer', revision: 3 }, { openedRevision: third })).toMatchObject({
      opened: third,
      latest: newer,
      pinned: true,
    });
  });

  it('is not pinned by the newest revision', () => expect(subject({ design: 'newer', revision: 6 })).toMatchObject({ pinned: false }));

  it('is a start of one’s own while there is no design', () => {
    expect(subject({}, { designs: [] })).toMatchObject({ opened: null, latest: null });
  });

  it('is nothing without a plant, or where the address names what is not there', () => {
    expect(subject({}, { plants: [], cases: [] })).toBe('plant');
    expect(subject({ design: 'gone' })).toBe('design');
    expect(subject({ caseId: 'gone' })).toBe('case');
  });

  it('is what an analysis froze, its plant included', () => {
    const frozenPlant = { ...plant, revision: 1 };
    const inputs = { design: { id: 'newer', revision: 3 }, cases: [{ ...nominal, plant: frozenPlant }], limits: [] };
    const analysis = { inputs } as unknown as KeptAnalysis;
    const wanted = wantedBy({}, analysis);
    expect(wanted).toEqual({ design: 'newer', revision: 3, caseId: 'nominal' });
    expect(subject(wanted, { analysis, openedRevision: design('newer', 3, '2026-04-01') })).toMatchObject({
      plant: frozenPlant,
      pinned: true,
    });
  });
});

describe('the address of a bench', () => {
  it('says what is looked at and how', () => {
    expect(benchLink({ design: 'd', revision: '3', chart: 'step', b: '2', step: '0.5', load: '-2' })).toEqual({
      design: 'd',
      revision: 3,
      analysis: undefined,
      caseId: undefined,
      chart: 'step',
      compare: 2,
      steps: { reference: 0.5, load: -2 },
    });
  });

  it('that says nonsense shows what the bench shows by itself', () => {
    const link = benchLink({ revision: '-1', chart: 'pie', b: 'x', step: '1e99', load: 'NaN' });
    expect(link).toMatchObject({ revision: undefined, chart: 'bode', compare: undefined, steps: { reference: 1, load: 1 } });
  });

  it('can say that nothing lies beside', () => expect(benchLink({ b: 'none' }).compare).toBe('none'));
});
