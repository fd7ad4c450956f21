import { quantities } from '@/analysis/project';
import type { Check, Quantity, Verdict } from '@/contract';
import { quantityText, type ReaderUnits } from '@/figures/quantity-text';
import type { CaseView } from './case-view';

/** One number of one case, as a cell, a row and a point of the chart show it. */
export interface CaseNumber {
  readonly view: CaseView;
  readonly value: number | null;
  /** Digits with their unit, or the word in their place. */
  readonly text: string;
  /** The digits alone, where the unit stands elsewhere. */
  readonly digits: string;
  /** null: nothing is demanded of this number. */
  readonly verdict: Verdict | null;
  readonly use: number | null;
}

const severity = ({ verdict, use }: Check): number => (use === null && verdict === 'fail' ? Infinity : (use ?? -Infinity));

/** A quantity may be demanded twice, as a least and as a greatest value: the one nearer its limit counts. */
export function checkOf(view: CaseView, quantity: Quantity): Check | null {
  const checks = view.result?.checks.filter((check) => check.quantity === quantity) ?? [];
  return checks.reduce<Check | null>((worst, next) => (worst === null || severity(next) > severity(worst) ? next : worst), null);
}

/** What a check is worth on this screen: nothing can be said of a case that changed since it was analysed. */
export const verdictOf = ({ outdated }: CaseView, { verdict }: Check): Verdict => (outdated ? 'notJudged' : verdict);

export function caseNumber(view: CaseView, quantity: Quantity, units: ReaderUnits): CaseNumber {
  const check = checkOf(view, quantity);
  const whole = { view, use: view.outdated ? null : (check?.use ?? null) };
  if (view.result === null) return { ...whole, value: null, text: 'not analysed', digits: '–', verdict: 'notJudged' };
  const verdict = check && verdictOf(view, check);
  const { numbers } = view.result;
  if (!numbers.closedLoop.stable)
    return { ...whole, value: null, text: 'unstable', digits: 'unstable', verdict: view.outdated ? 'notJudged' : 'fail' };
  const value = quantities[quantity].value(numbers);
  if (value !== null) {
    const { text, number } = quantityText(quantity, value, units);
    return { ...whole, value, text, digits: number, verdict };
  }
  const word = quantities[quantity].nullIsUnlimited ? 'no limit' : 'no number';
  return { ...whole, value, text: word, digits: quantities[quantity].nullIsUnlimited ? 'none' : '–', verdict };
}
