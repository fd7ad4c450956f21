/** What a project makes of the engine: which loop a case is, and what its numbers are worth. */
export { caseLoop } from './case-loop';
export { headline } from './headline';
export { judgeCase, type Judgement, type Stated } from './judge-case';
export { limitUse } from './limit-use';
export { runnablePlant } from './runnable-plant';
export { quantities, type Reading } from './quantities';
export { worstVerdict } from './worst-verdict';
