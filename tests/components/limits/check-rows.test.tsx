import { describe, expect, it } from 'vitest';
import { checkRows, placeOf } from '@/components/limits/model/check-rows';
import { type DemandRow, emptyRow, typed } from '@/components/limits/model/demand-row';
import { rowErrors } from '@/components/limits/model/row-errors';
import type { Limit } from '@/contract';

const units = { magnitude: 'dB', frequency: 'rad/s' } as const;

function row(quantity: DemandRow['quantity'], bound: Limit['bound'], limit: string, target = ''): DemandRow {
  return {
    ...emptyRow({ quantity, bound }),
    limit: typed(limit, quantity, units),
    target: target === '' ? { text: '', value: null } : typed(target, quantity, units),
  };
}
const errorsOf = (...rows: DemandRow[]) => checkRows(rows, units).errors;

describe('what is typed as limits', () => {
  it('is read in the contract’s units, an empty target as none', () => {
    const { limits } = checkRows([row('gainMargin', 'min', '6', '7'), row('overshootPercent', 'max', '5')], units);
    expect(limits).toEqual([
      { quantity: 'gainMargin', bound: 'min', limit: 10 ** (6 / 20), target: 10 ** (7 / 20), source: '' },
      { quantity: 'overshootPercent', bound: 'max', limit: 5, target: null, source: '' },
    ]);
  });

  it('is wrong at the field where it is no number', () => {
    expect(errorsOf(row('ms', 'max', 'much', 'less'))[0]).toEqual({ limit: 'A number, as in 0.35.', target: 'A number, or nothing.' });
    expect(errorsOf(row('ms', 'max', ''))[0].limit).toMatch(/is needed/);
  });

  it('is wrong at the target that lies outside its limit, said in the reader’s units', () => {
    expect(errorsOf(row('gainMargin', 'min', '6', '5'))[0].target).toBe('A target lies inside its limit: no less than 6 dB.');
    expect(errorsOf(row('ms', 'max', '1.7', '1.8'))[0].target).toBe('A target lies inside its limit: no more than 1.70.');
  });

  it('is wrong where the least is more than the most', () => {
    const [first, second] = errorsOf(row('bandwidth', 'min', '20'), row('bandwidth', 'max', '10'));
    expect(first.limit).toBeUndefined();
    expect(second.limit).toBe('At least 20 rad/s and at most 10 rad/s cannot both hold.');
  });

  it('is wrong where the quantity cannot be so, or its default target cannot', () => {
    expect(errorsOf(row('phaseMargin', 'min', '200'))[0].limit).toMatch(/between 0° and 180°/);
    expect(errorsOf(row('ms', 'max', '1.05'))[0].target).toMatch(/Left empty, the target would be 0\.95/);
  });
});

describe('what the server refuses', () => {
  const rows = [row('ms', 'max', '1.7'), row('phaseMargin', 'min', '45')];
  const sent = checkRows(rows, units).limits!;
  const refused = { sent, errors: [{ pointer: '/items/1/limit', detail: 'Not today.' }] };
  const shown = (now: DemandRow[], asked = false) => rowErrors({ rows: now, checked: checkRows(now, units), refused, asked });

  it('stands at the field that its pointer names, though the rows have moved', () => {
    expect(shown([rows[1], rows[0]])(rows[1]).limit).toBe('Not today.');
    expect(shown(rows)(rows[0])).toEqual({});
  });

  it('goes once the row says something else', () => {
    const changed = row('phaseMargin', 'min', '50');
    expect(shown([rows[0], changed])(changed)).toEqual({});
  });

  it('has a place for every pointer into the list, and none for others', () => {
    expect(placeOf('/items/3/target')).toEqual({ row: 3, field: 'target' });
    expect(placeOf('/items/3/quantity')).toEqual({ row: 3, field: 'limit' });
    expect(placeOf('#')).toBeNull();
  });

  it('is not mixed with what nobody has asked for yet', () => {
    const added = row('mt', 'max', '');
    expect(shown([added])(added)).toEqual({});
    expect(shown([added], true)(added).limit).toMatch(/is needed/);
  });
});
