import { buildLoop } from '@/analysis';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { loopNumbers } from '@/analysis/margins/loop-numbers';
import { judgeStability } from '@/analysis/margins/stability';
import type { Loop } from '@/contract';

/** What a search over gains asks of each loop: every margin and peak, and whether it is stable. */
export function marginsAlone(input: Loop) {
  const model = buildLoop(input);
  const loop = new ContinuousLoop(model);
  const numbers = loopNumbers(loop, 'full');
  return { ...numbers, ...judgeStability(model, loop, { ...numbers, modulus: numbers.margins.modulus }) };
}
