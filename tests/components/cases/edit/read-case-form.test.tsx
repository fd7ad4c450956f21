import { describe, expect, it } from 'vitest';
import { differences } from '@/components/cases/edit/both-versions';
import { caseForm, emptyCaseForm, isCaseForm } from '@/components/cases/edit/case-form';
import { fieldOfPointer, readCaseForm } from '@/components/cases/edit/read-case-form';
import type { PlantRevision } from '@/contract';
import { aCase, kmh, plantId } from '../cases-harness';

const plant = {
  id: plantId,
  name: 'Watered asphalt',
  revision: 3,
  plant: { kind: 'formula', text: 'k/(m*s)', parameters: { k: 1, m: 1500 } },
} as unknown as PlantRevision;
const typed = { ...emptyCaseForm(plantId, 'km/h'), name: 'slow' };

describe('the case editor reads its fields', () => {
  it('makes the case that was typed, in the contract’s units', () => {
    const { content, errors } = readCaseForm({ ...typed, speed: '30', mass: '1380', parameters: { deadTime: '0,17', m: '1380' } }, plant);
    expect(errors).toEqual({});
    expect(content).toEqual({
      name: 'slow',
      plantId,
      plantRevision: null,
      parameters: { deadTime: 0.17, m: 1380 },
      axes: { speed: kmh(30), mass: 1380 },
      basis: 'extrapolated',
    });
  });

  it('leaves out what the plant has not', () => {
    expect(readCaseForm({ ...typed, parameters: { tau: '2' } }, plant).content?.parameters).toEqual({});
  });

  it.each([
    ['name', { name: ' ' }, 'A name has at least one character.'],
    ['speed', { speed: '-1' }, 'A speed is 0 or more.'],
    ['mass', { mass: '0' }, 'A mass is more than 0.'],
    ['grade', { grade: 'steep' }, 'A number, as in 0.35.'],
    ['plantRevision', { plantRevision: '9' }, 'The newest revision is 3.'],
    ['plantRevision', { plantRevision: ' ' }, 'Revisions are counted from 1.'],
    ['parameters.deadTime', { parameters: { deadTime: '-0.1' } }, 'Dead time is 0 or more.'],
    ['parameters.gainFactor', { parameters: { gainFactor: '0' } }, 'A gain factor is not zero and of magnitude at most 1e12.'],
  ])('says at the field %s what is wrong', (field, change, message) => {
    const { content, errors } = readCaseForm({ ...typed, ...change }, plant);
    expect(content).toBeNull();
    expect(errors).toEqual({ [field]: message });
  });

  it('shows a kept case with the digits that were typed', () => {
    const kept = aCase(1, { axes: { speed: kmh(30) }, parameters: { gainFactor: 1.1 }, plantRevision: 2 });
    const form = caseForm(kept, 'km/h');
    expect(form).toMatchObject({ speed: '30', mass: '', parameters: { gainFactor: '1.1' }, plantRevision: '2' });
    expect(readCaseForm(form, plant).content?.axes.speed).toBeCloseTo(kmh(30), 12);
    expect(isCaseForm(JSON.parse(JSON.stringify(form)))).toBe(true);
    expect(isCaseForm({ name: 'slow' })).toBe(false);
  });

  it('finds the field that a pointer of the server means', () => {
    expect(fieldOfPointer('/axes/speed')).toBe('speed');
    expect(fieldOfPointer('/parameters/deadTime')).toBe('parameters.deadTime');
    expect(fieldOfPointer('/name')).toBe('name');
  });

  it('lays two versions beside each other, where they differ', () => {
    const mine = { ...typed, speed: '30', parameters: { deadTime: '0.17' } };
    const theirs = { ...typed, speed: '40', basis: 'measured' as const };
    expect(differences(mine, theirs, [plant])).toEqual([
      { name: 'Speed', mine: '30 km/h', theirs: '40 km/h' },
      { name: 'Dead time', mine: '0.17 s', theirs: '–' },
      { name: 'Known', mine: 'extrapolated', theirs: 'measured' },
    ]);
  });
});
