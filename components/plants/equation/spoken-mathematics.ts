import type { EquationParts } from './equation-parts';
import { superscripts } from './polynomial-text';

const powerWords = (digits: string): string => {
  const exponent = Number([...digits].map((digit) => superscripts.indexOf(digit)).join(''));
  if (exponent === 2) return ' squared';
  return exponent === 3 ? ' cubed' : ` to the power ${exponent}`;
};

/** Printed mathematics as one says it: a screen reader skips brackets, signs and raised figures. */
export const spokenMathematics = (text: string): string =>
  text
    .replace(/([s)\d⁰¹²³⁴⁵⁶⁷⁸⁹]) ?\(/g, '$1 times (')
    .replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, powerWords)
    .replace(/\(/g, 'open bracket ')
    .replace(/\)/g, ' close bracket')
    .replace(/ \+ /g, ' plus ')
    .replace(/ − /g, ' minus ')
    .replace(/−/g, 'minus ');

/** The sentence that stands for a typeset plant. */
export function spokenEquation({ over, under, delay }: EquationParts): string {
  const fraction = under === '1' ? spokenMathematics(over) : `${spokenMathematics(over)}, over ${spokenMathematics(under)}`;
  return `P of s is ${fraction}${delay ? `, times e to the power of ${spokenMathematics(delay)}` : ''}`;
}
