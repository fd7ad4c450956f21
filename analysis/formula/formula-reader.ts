import { degree, inverse, isNumber, number, plus, power, times, VARIABLE, type Fraction } from './fraction';
import type { FormulaNode } from './formula-node';
import { refusal } from './refusal';

type OperatorNode = Extract<FormulaNode, { type: 'OperatorNode' }>;
type FunctionNode = Extract<FormulaNode, { type: 'FunctionNode' }>;

const HIGHEST_POWER = 24;
const CONSTANTS: Readonly<Record<string, number>> = { e: Math.E, pi: Math.PI };
const WORD = /[A-Za-z_$][A-Za-z0-9_$]*|\^|\/|[^\sA-Za-z0-9_.$]/g;

/**
 * Walks the tree of a formula and works it out as one fraction in s.
 * The walk goes through the text from left to right, so that the nth use of a name or sign in the tree is the nth in the
 * text: that is where a refusal points.
 */
export class FormulaReader {
  private readonly places = new Map<string, number[]>();
  private readonly used = new Map<string, number>();
  private place = 0;

  constructor(
    text: string,
    private readonly parameters: Readonly<Record<string, number>>,
  ) {
    for (const match of text.matchAll(WORD)) this.places.set(match[0], [...(this.places.get(match[0]) ?? []), match.index]);
  }

  /** @throws LoopError at /plant/text for what is no real rational function times one dead time */
  read(node: FormulaNode): Fraction {
    const value = this.valueOf(node);
    if (!Number.isFinite(value.gain)) throw refusal('This is no finite number.', this.place);
    if (degree(value.top) > HIGHEST_POWER || degree(value.bottom) > HIGHEST_POWER)
      throw refusal(`No power of s above ${HIGHEST_POWER}, please.`, this.place);
    return value;
  }

  private valueOf(node: FormulaNode): Fraction {
    switch (node.type) {
      case 'ConstantNode':
        if (typeof node.value !== 'number') throw refusal('Only numbers, s and named parameters can stand here.', this.place);
        return number(node.value);
      case 'SymbolNode':
        return this.symbol(node.name);
      case 'ParenthesisNode':
        return this.read(node.content);
      case 'OperatorNode':
        return this.operator(node);
      case 'FunctionNode':
        return this.call(node);
      default:
        throw refusal('Only sums, products, quotients, whole powers and exp can stand in a formula.', this.place);
    }
  }

  private symbol(name: string): Fraction {
    this.moveTo(name);
    if (name === 's') return VARIABLE;
    const value = Object.hasOwn(this.parameters, name) ? this.parameters[name] : CONSTANTS[name];
    if (value === undefined) throw refusal(`“${name}” is neither s nor a parameter with a value.`, this.place);
    return number(value);
  }

  private operator({ op, args }: OperatorNode): Fraction {
    if (op === '^' && args.length === 2) return this.raised(args[0], args[1]);
    const first = this.read(args[0]);
    if (args.length === 1 && (op === '-' || op === '+')) return op === '-' ? times(number(-1), first) : first;
    this.moveTo(op);
    const { place } = this;
    if (args.length !== 2 || !['+', '-', '*', '/'].includes(op)) throw refusal(`“${op}” has no meaning in a formula.`, place);
    const second = this.read(args[1]);
    if (op === '*') return times(first, second);
    if (op === '/') {
      if (second.gain === 0) throw refusal('This divides by zero.', place);
      return times(first, inverse(second));
    }
    const sum = plus(first, op === '-' ? times(number(-1), second) : second);
    if (!sum) throw refusal('Parts with different dead times cannot be added: one dead time multiplies the whole plant.', place);
    return sum;
  }

  private raised(base: FormulaNode, exponent: FormulaNode): Fraction {
    const isEuler = base.type === 'SymbolNode' && base.name === 'e' && !Object.hasOwn(this.parameters, 'e');
    const isProduct = base.type === 'FunctionNode' && !isExponential(base);
    const value = isProduct ? null : this.read(base);
    const product = isProduct ? { base, outer: this.read(base.fn), inner: this.argument(base) } : null;
    this.moveTo('^');
    const { place } = this;
    const to = this.read(exponent);
    if (isEuler) return this.exponential(to, place);
    if (!isNumber(to) || !Number.isInteger(to.gain) || Math.abs(to.gain) > HIGHEST_POWER)
      throw refusal(`A power is a whole number of at most ${HIGHEST_POWER}.`, place);
    const inner = product ? product.inner : value!;
    if (inner.gain === 0 && to.gain < 0) throw refusal('This divides by zero.', place);
    return product ? times(product.outer, power(inner, to.gain)) : power(inner, to.gain);
  }

  /** exp(…), or a product whose sign was left out: the parser takes s (…) for a function called s. */
  private call(node: FunctionNode): Fraction {
    if (!isExponential(node)) return times(this.read(node.fn), this.argument(node));
    this.moveTo('exp');
    const { place } = this;
    return this.exponential(this.argument(node), place);
  }

  private argument({ args }: FunctionNode): Fraction {
    if (args.length !== 1) throw refusal('One value goes into these brackets.', this.place);
    return this.read(args[0]);
  }

  private exponential(exponent: Fraction, place: number): Fraction {
    if (isNumber(exponent)) return number(Math.exp(exponent.gain));
    const [factor] = exponent.top;
    const isMultipleOfS =
      exponent.top.length === 1 && exponent.bottom.length === 0 && exponent.deadTime === 0 && factor.length === 2 && factor[1] === 0;
    if (!isMultipleOfS) throw refusal('Dead time is exp of a number times s, as in exp(-0.08 s).', place);
    return { ...number(1), deadTime: -exponent.gain * factor[0] };
  }

  private moveTo(token: string): void {
    const count = this.used.get(token) ?? 0;
    const places = this.places.get(token) ?? [];
    this.used.set(token, count + 1);
    this.place = places[Math.min(count, places.length - 1)] ?? this.place;
  }
}

const isExponential = ({ fn }: FunctionNode): boolean => fn.type === 'SymbolNode' && fn.name === 'exp';
