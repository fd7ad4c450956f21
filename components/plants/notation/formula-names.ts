const NAME_OR_NUMBER = /[A-Za-z_][A-Za-z0-9_]*|(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?/gi;
/** What a formula knows by itself. */
const known = new Set(['s', 'exp', 'e', 'pi']);

/**
 * The named parameters of a formula, each once, in the order in which they are met.
 *
 * @example formulaNames('k exp(-0.08 s)/(m s + 2e3 b)') // ["k", "m", "b"]
 */
export function formulaNames(text: string): string[] {
  const names = (text.match(NAME_OR_NUMBER) ?? []).filter((piece) => /^[A-Za-z]/.test(piece) && !known.has(piece));
  return [...new Set(names)];
}
