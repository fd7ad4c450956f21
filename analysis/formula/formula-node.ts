import { parse } from 'mathjs/number';
import { refusal } from './refusal';
import { refuseBrackets } from './refuse-brackets';

/** The only kinds of node that a formula may consist of. Whatever else the parser knows is refused by name. */
export type FormulaNode =
  | { readonly type: 'ConstantNode'; readonly value: unknown }
  | { readonly type: 'SymbolNode'; readonly name: string }
  | { readonly type: 'ParenthesisNode'; readonly content: FormulaNode }
  | { readonly type: 'OperatorNode'; readonly op: string; readonly args: readonly FormulaNode[] }
  | { readonly type: 'FunctionNode'; readonly fn: FormulaNode; readonly args: readonly FormulaNode[] };

const LONGEST = 500;

/**
 * The tree of a formula. mathjs only parses; nothing of it is ever evaluated.
 * @throws LoopError at /plant/text for text that is not mathematics, with the character where it stops being so
 */
export const parseFormula = (text: string): FormulaNode => {
  if (text.length > LONGEST) throw refusal(`A formula has at most ${LONGEST} characters.`, LONGEST);
  refuseBrackets(text);
  try {
    return parse(text) as FormulaNode;
  } catch (error) {
    const place = error instanceof Error && 'char' in error ? Number(error.char) - 1 : 0;
    throw refusal('This cannot be read as mathematics.', Math.min(Math.max(place, 0), text.length - 1));
  }
};
