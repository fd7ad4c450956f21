import type { Loop, Warning } from '@/contract';
import { toParallelGains } from '@/analysis/loop/parallel-gains';
import { limitOf } from './end-values';
import type { LoopFunction } from './loop-function';
import type { Stability } from './stability';

/** What a careful engineer would add to the numbers, a sentence each. */
export const loopWarnings = (
  { controller }: Loop,
  loop: LoopFunction,
  { stability, capped }: { stability: Stability; capped: boolean },
): Warning[] => {
  const warnings: Warning[] = [];
  const say = (applies: boolean, code: string, message: string) => {
    if (applies) warnings.push({ code, message });
  };
  const limit = limitOf(loop.atInfinity.loop, 'infinity');
  const { kp, kd } = toParallelGains(controller);
  say(
    controller.form === 'series' && controller.kp > 0 && Math.min(kp, kd) < 0,
    'negativeConvertedGain',
    'The filter time is longer than a time constant of the series form: in parallel form one of the gains is negative.',
  );
  say(
    stability.hidden.length > 0,
    'hiddenMode',
    'A mode that does not decay by itself is cancelled inside the loop: the loop gain does not show it, and it stays.',
  );
  say(stability.onBoundary, 'onBoundary', 'A closed-loop pole lies on the imaginary axis: the loop is exactly on the edge of stability.');
  say(
    loop.deadTime > 0 && limit !== 0,
    'neutralLoop',
    Math.abs(limit) < 1
      ? 'With dead time and direct feedthrough the crossovers never end: the first 200 are listed.'
      : 'With dead time and a high-frequency gain of 1 or more, any error returns undiminished: the loop cannot be stable.',
  );
  say(capped, 'gridCapped', 'The curves are drawn with fewer points than they bend: 4,000 is the most. The numbers are exact.');
  return warnings;
};
