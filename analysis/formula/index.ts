/** Text to plant. An entry of its own, so that nothing which runs in a page loads the parser by accident. */
export { readFormula, type ReadFormula } from './read-formula';
export { describeFormula } from './describe-formula';
export { resolveFormula, resolvePlant } from './resolve-formula';
