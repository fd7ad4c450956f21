import { describe, expect, it } from 'vitest';
import { declareEnd } from '@/components/cases/panel/declare-end';
import { beyondText, declaredText, endName, together } from '@/components/cases/panel/end-words';
import { kmh } from '../cases-harness';

const slow = { axis: 'speed', end: 'low' } as const;
const range = (parts: object) => ({
  axis: 'speed' as const,
  engage: null,
  disengage: null,
  lowIsPhysical: false,
  highIsPhysical: false,
  ...parts,
});

describe('an end of what was checked', () => {
  it('is declared beside the other ends, with where the loop lets go and takes up', () => {
    const mass = { ...range({ lowIsPhysical: true }), axis: 'mass' as const };
    expect(declareEnd([mass], { ...slow, physical: true, disengage: kmh(30), engage: kmh(35) })).toEqual([
      mass,
      range({ lowIsPhysical: true, disengage: kmh(30), engage: kmh(35) }),
    ]);
  });

  it('is taken back without losing what else was said', () => {
    const before = range({ lowIsPhysical: true, highIsPhysical: true, disengage: 8 });
    expect(declareEnd([before], { ...slow, physical: false })).toEqual([{ ...before, lowIsPhysical: false }]);
  });

  it('is told in what the car may do', () => {
    const edge = { ...slow, physical: true };
    expect(endName(slow)).toBe('the slowest case');
    expect(beyondText({ edge, at: kmh(30), declared: undefined }, 'km/h')).toBe('nothing slower than 30 km/h');
    expect(declaredText({ edge, at: kmh(30), declared: range({ disengage: kmh(30), engage: kmh(35) }) }, 'km/h')).toBe(
      'the loop lets go below 30 km/h (takes up from 35 km/h)',
    );
    const light = { axis: 'mass', end: 'low', physical: true } as const;
    expect(declaredText({ edge: light, at: 1380, declared: undefined }, 'km/h')).toBe('nothing lighter than 1,380 kg can happen');
  });

  it('joins words as a sentence does', () => {
    expect(together(['a', 'b', 'c'])).toBe('a, b and c');
  });
});
