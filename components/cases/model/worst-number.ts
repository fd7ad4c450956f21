import { quantityRules, type Quantity } from '@/contract';
import type { CaseNumber } from './case-number';

const failed = ({ verdict, value }: CaseNumber) => verdict === 'fail' && value === null;

/** Nearest its limit or furthest beyond it; an unstable case before any. */
const severity = (number: CaseNumber): number => (failed(number) ? Infinity : (number.use ?? -Infinity));

/** Without a limit, the end of the numbers that a limit would stand at; null where a limit could stand at both. */
function extreme(numbers: readonly CaseNumber[], quantity: Quantity): CaseNumber | null {
  const { bounds } = quantityRules[quantity];
  if (bounds.length > 1) return null;
  const sign = bounds[0] === 'max' ? 1 : -1;
  const worth = ({ value }: CaseNumber) => (value === null ? -Infinity : sign * Math.abs(value));
  const worst = numbers.reduce<CaseNumber | null>((most, next) => (most === null || worth(next) > worth(most) ? next : most), null);
  return worst?.value === null ? null : worst;
}

/** The case that is singled out for one number: the one nearest the edge. null where none is. */
export function worstNumber(numbers: readonly CaseNumber[], quantity: Quantity): CaseNumber | null {
  const analysed = numbers.filter(({ view }) => view.result !== null && !view.outdated);
  const judged = analysed.filter((number) => failed(number) || number.use !== null);
  if (judged.length === 0) return extreme(analysed, quantity);
  return judged.reduce((worst, next) => (severity(next) > severity(worst) ? next : worst));
}

/** The worst first; those without a number last. */
export const byWorst = (a: CaseNumber, b: CaseNumber): number => {
  const [left, right] = [severity(a), severity(b)];
  return left === right ? 0 : right - left;
};
