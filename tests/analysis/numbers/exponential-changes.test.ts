import { expect, it } from 'vitest';
import { matrixOf, scaledBy } from '@/analysis/numbers/matrix';
import { ExponentialChanges } from '@/analysis/numbers/matrix-exponential';

const stiff = matrixOf([[-400, 3, 0], [0, -2, 5], [1, -5, -2]]); // prettier-ignore
const shares = [0.04, 0.3];

it('the changes of a matrix doubled thrice are those of eight times the matrix', () => {
  const exponentials = new ExponentialChanges(3, shares);
  exponentials.of(stiff);
  const doubled = exponentials.doubled(3).map(({ data }) => [...data]);
  const direct = new ExponentialChanges(3, shares).of(scaledBy(stiff, 8));
  direct.forEach(({ data }, k) => data.forEach((value, i) => expect(Math.abs(value - doubled[k][i])).toBeLessThan(1e-13)));
});

it('a slow mode keeps its digits beside a fast one', () => {
  const [change] = new ExponentialChanges(2, [0.5]).of(matrixOf([[-1e9, 0], [0, -1e-9]])); // prettier-ignore
  expect(change.data[3]).toBeCloseTo(Math.expm1(-0.5e-9), 24);
});
