import { describe, expect, it } from 'vitest';
import { type ListRow, sortedRows } from '@/components/cases/list/list-sort';
import { caseNumber } from '@/components/cases/model/case-number';
import { caseVerdict } from '@/components/cases/model/case-verdict';
import { sixCases, sixNumbers, viewsOf } from '../cases-harness';

const units = { frequency: 'rad/s', magnitude: 'dB' } as const;
const rows = viewsOf(sixCases, sixNumbers).map((view): ListRow => ({
  view,
  verdict: caseVerdict(view),
  numbers: [caseNumber(view, 'ms', units)],
}));
const order = (by: Parameters<typeof sortedRows>[1]['by'], reversed = false) =>
  sortedRows(rows, { by, reversed }, ['ms']).map(({ numbers }) => numbers[0].text);

describe('the list of cases', () => {
  it('stands as the cases were made until it is sorted', () => {
    expect(order('order')).toEqual(['1.63', '1.51', '1.36', '1.56', '1.46', '1.32']);
  });

  it('sorts a number from the edge inwards, and the other way', () => {
    expect(order('ms')).toEqual(['1.63', '1.56', '1.51', '1.46', '1.36', '1.32']);
    expect(order('ms', true)[0]).toBe('1.32');
  });

  it('sorts by verdict, worst first, and by place as numbers rather than letters', () => {
    expect(order('verdict')[0]).toBe('1.63');
    expect(order('name')).toEqual(['1.63', '1.56', '1.51', '1.46', '1.36', '1.32']);
  });
});
