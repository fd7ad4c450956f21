import { describe, expect, it } from 'vitest';
import { benchSubject, type Wanted, wantedBy } from '@/components/bench/subject/bench-subject';
import { benchLink } from '@/components/bench/subject/bench-link';
import type { Conditions, DesignRevision, FrozenCase, KeptAnalysis, Project } from '@/contract';

const project = { id: 'p' } as Project;
const plant = { id: 'plant', revision: 3 } as FrozenCase['plant'];
const nominal = { id: 'nominal', name: 'nominal', parameters: {}, plant } as FrozenCase;
const heavy = { ...nominal, id: 'heavy', name: 'heavy' };
const conditions: Conditions = { cases: [nominal, heavy], limits: [], operatingRange: [] };
const design = (id: string, revision: number, createdAt: string) => ({ id, revision, createdAt }) as DesignRevision;
const older = design('older', 2, '2026-05-01');
const newer = design('newer', 6, '2026-05-02');

const subject = (wanted: Wanted, changes: Partial<Parameters<typeof benchSubject>[0]> = {}) =>
  benchSubject({ project, conditions, designs: [older, newer], openedRevision: null, worstCaseId: undefined, ...changes }, wanted);

describe('what lies on the bench', () => {
  it('is the design that was kept last, in the first case', () => {
    expect(subject({})).toMatchObject({ opened: newer, latest: newer, pinned: false, shownCase: nominal, plant });
  });

  it('is shown in the case nearest its limit, where nobody chose another and it is still there', () => {
    expect(subject({}, { worstCaseId: 'heavy' })).toMatchObject({ shownCase: heavy });
    expect(subject({ caseId: 'nominal' }, { worstCaseId: 'heavy' })).toMatchObject({ shownCase: nominal });
    expect(subject({}, { worstCaseId: 'gone' })).toMatchObject({ shownCase: nominal });
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
    expect(subject({}, { conditions: { ...conditions, cases: [] } })).toBe('plant');
    expect(subject({ design: 'gone' })).toBe('design');
    expect(subject({ caseId: 'gone' })).toBe('case');
  });

  it('is the design and revision that an analysis froze', () => {
    const analysis = { inputs: { design: { id: 'newer', revision: 3 }, ...conditions } } as unknown as KeptAnalysis;
    const wanted = wantedBy({}, analysis);
    expect(wanted).toEqual({ design: 'newer', revision: 3, caseId: undefined });
    expect(subject(wanted, { openedRevision: design('newer', 3, '2026-04-01') })).toMatchObject({ pinned: true });
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
