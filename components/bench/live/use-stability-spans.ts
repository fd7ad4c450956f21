import { useEffect, useState } from 'react';
import { analyseLoop, LoopError } from '@/analysis';
import type { Loop } from '@/contract';
import { useRestingQuestion } from '../bench-context';
import type { Gain } from '../draft/gain';
import type { Settings } from '../draft/settings';
import { stabilitySpan, type StabilitySpan } from './stability-span';

export type StabilitySpans = Partial<Record<Gain, StabilitySpan>>;

/** Milliseconds of one slice: short enough that a finger put down meanwhile is answered in its own frame. */
const SLICE_MS = 6;

const fields = { kp: 'kp', ki: 'ki', kd: 'kd', filterTime: 'derivativeFilterTime' } as const;

function stableWith(loop: Loop, gain: Gain, value: number): boolean {
  if (gain === 'filterTime' && value < 0) return true;
  try {
    const changed = { ...loop, controller: { ...loop.controller, [fields[gain]]: value } };
    return analyseLoop(changed, { curves: false, responses: false, detail: 'live' }).closedLoop.stable;
  } catch (error) {
    // Where a loop has no meaning there is no edge to draw either.
    if (error instanceof LoopError) return true;
    throw error;
  }
}

const sizeOf = (settings: Settings, gain: Gain): number => Math.abs(settings[gain]) || Math.abs(settings.kp) || 1;

/**
 * Where each of the gains would make the loop unstable, the others as they are. Looked for once the answer stands in full, in slices
 * between which the page goes on; a gain that moves again ends the search. What was found stays shown until it is found anew.
 */
export function useStabilitySpans(gains: readonly Gain[]): StabilitySpans {
  const question = useRestingQuestion();
  const [spans, setSpans] = useState<StabilitySpans>({});
  useEffect(() => {
    if (question === null) return;
    const { loop, settings } = question;
    const searches = gains.map((gain) => {
      const search = stabilitySpan({
        value: settings[gain],
        size: sizeOf(settings, gain),
        stableAt: (value) => stableWith(loop, gain, value),
      });
      return { gain, search };
    });
    let timer: ReturnType<typeof setTimeout>;
    const slice = () => {
      const end = performance.now() + SLICE_MS;
      while (searches.length > 0 && performance.now() < end) {
        const { gain, search } = searches[0];
        const step = search.next();
        if (!step.done) continue;
        searches.shift();
        setSpans((before) => ({ ...before, [gain]: step.value }));
      }
      if (searches.length > 0) timer = setTimeout(slice, 10);
    };
    timer = setTimeout(slice, 60);
    return () => clearTimeout(timer);
  }, [gains, question]);
  return spans;
}
