import { describe, expect, it } from 'vitest';
import { type DemandRow, demandOf, rowsOf, typed } from '@/components/limits/model/demand-row';
import { beginEdit, changeRows, isChanged, meetKept, undo } from '@/components/limits/model/limits-edit';
import { differences, onTopOf, takingTheirs } from '@/components/limits/model/meet-theirs';
import type { Limit } from '@/contract';

const units = { magnitude: 'dB', frequency: 'rad/s' } as const;
const ms = (limit: number): Limit => ({ quantity: 'ms', bound: 'max', limit, target: null, source: 'team rule 4' });
const phase = (limit: number): Limit => ({ quantity: 'phaseMargin', bound: 'min', limit, target: null, source: 'team rule 4' });
const settling = (limit: number): Limit => ({ quantity: 'settlingTime', bound: 'max', limit, target: null, source: 'driver' });

const base = [ms(1.7), phase(45)];
const said = (rows: readonly DemandRow[]) => rows.map(demandOf);

describe('two people who changed limits', () => {
  it('part where they say different things, and it is told who changed what', () => {
    const yours = rowsOf([ms(1.6), phase(45), settling(6)], units);
    const theirs = [ms(1.5), phase(50)];
    expect(differences(base, yours, theirs).map(({ key, changedBy }) => [key, changedBy])).toEqual([
      ['ms max', 'both'],
      ['phaseMargin min', 'them'],
      ['settlingTime max', 'you'],
    ]);
  });

  it('do not part where both say the same', () => {
    expect(differences(base, rowsOf([ms(1.6), phase(45)], units), [ms(1.6), phase(45)])).toEqual([]);
  });

  it('come together with yours on top: what you changed is yours, the rest theirs', () => {
    const rows = rowsOf([ms(1.6), phase(45), settling(6)], units);
    expect(said(onTopOf({ base, rows, theirs: [ms(1.5), phase(50)] }, units))).toEqual([ms(1.6), phase(50), settling(6)]);
  });

  it('come together also where one of them took a demand out', () => {
    const without = rowsOf([ms(1.7)], units);
    expect(said(onTopOf({ base, rows: without, theirs: [ms(1.5), phase(45)] }, units))).toEqual([ms(1.5)]);
    const untouched = rowsOf([ms(1.6), phase(45)], units);
    expect(said(onTopOf({ base, rows: untouched, theirs: [ms(1.7)] }, units))).toEqual([ms(1.6)]);
  });

  it('lose nothing that is half typed', () => {
    const [first, second] = rowsOf(base, units);
    const rows = [
      { ...first, limit: typed('1.', 'ms', units) },
      { ...second, limit: typed('fif', 'phaseMargin', units) },
    ];
    expect(onTopOf({ base, rows, theirs: [ms(1.7), phase(50)] }, units)[1].limit.text).toBe('fif');
  });

  it('agree row by row where theirs is taken', () => {
    const rows = rowsOf([ms(1.6), phase(45), settling(6)], units);
    const theirs = [ms(1.5), phase(45)];
    const taken = differences(base, rows, theirs).reduce<readonly DemandRow[]>(
      (now, difference) => takingTheirs(now, difference, units),
      rows,
    );
    expect(said(taken)).toEqual(theirs);
  });
});

describe('an edit beside what others keep', () => {
  const before = beginEdit({ etag: '"1"', items: base }, units);
  const theirs = { etag: '"2"', items: [ms(1.5), phase(45)] };

  it('follows while nothing is typed', () => {
    const met = meetKept(before, theirs);
    expect(said(met.rows)).toEqual(theirs.items);
    expect(met.base.etag).toBe('"2"');
  });

  it('stays on its own version once something is', () => {
    const typing = changeRows(before, rowsOf([ms(1.6), phase(45)], units));
    expect(meetKept(typing, theirs)).toBe(typing);
  });

  it('is done once just the same was kept', () => {
    const typing = changeRows(before, rowsOf([ms(1.5), phase(45)], units));
    expect(isChanged(meetKept(typing, theirs))).toBe(false);
  });

  it('is taken back field by field', () => {
    const [first, second] = before.rows;
    const typed1 = changeRows(before, [{ ...first, source: 'r' }, second], 'ms max source');
    const typed2 = changeRows(typed1, [{ ...first, source: 'ru' }, second], 'ms max source');
    const out = changeRows(typed2, [second]);
    expect(undo(out).rows[0].source).toBe('ru');
    expect(undo(undo(out)).rows[0].source).toBe('team rule 4');
    expect(undo(undo(undo(out))).rows).toEqual(before.rows);
  });
});
