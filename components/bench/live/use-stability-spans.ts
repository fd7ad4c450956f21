import { useEffect, useState } from 'react';
import { analyseLoop, LoopError } from '@/analysis';
import { useDraft, useRestingQuestion } from '../bench-context';
import { current } from '../draft/draft';
import { type Gain, isTime, mustBePositive } from '../draft/gain';
import { controllerOf, type Form, type Settings } from '../draft/settings';
import type { BenchQuestion } from './bench-loop';
import { stabilitySpan, type StabilitySpan } from './stability-span';

export type StabilitySpans = Partial<Record<Gain, StabilitySpan>>;

interface Found {
  readonly form: Form;
  readonly spans: StabilitySpans;
}

/** Milliseconds of one slice: short enough that a finger put down meanwhile is answered in its own frame. */
const SLICE_MS = 6;

/** A time that no controller can have makes no loop unstable. */
const impossible = (gain: Gain, form: Form, value: number): boolean =>
  mustBePositive(gain, form) ? value <= 0 : isTime(gain, form) && value < 0;

function stableWith({ loop, settings }: BenchQuestion, gain: Gain, value: number): boolean {
  if (impossible(gain, settings.form, value)) return true;
  try {
    const changed = { ...loop, controller: controllerOf({ ...settings, [gain]: value }) };
    return analyseLoop(changed, { curves: false, responses: false, detail: 'live' }).closedLoop.stable;
  } catch (error) {
    // Where a loop has no meaning there is no edge to draw either.
    if (error instanceof LoopError) return true;
    throw error;
  }
}

const NOTHING_FOUND: StabilitySpans = {};

const sizeOf = (settings: Settings, gain: Gain): number => Math.abs(settings[gain] ?? 0) || Math.abs(settings.kp) || 1;

/**
 * Where each of the gains would make the loop unstable, the others as they are. Looked for once the answer stands in full, in slices
 * between which the page goes on; a gain that moves again ends the search. What was found stays shown until it is found anew, or the form changes.
 */
export function useStabilitySpans(gains: readonly Gain[]): StabilitySpans {
  const question = useRestingQuestion();
  const form = useDraft((draft) => current(draft).form);
  const [found, setFound] = useState<Found>({ form, spans: {} });
  useEffect(() => {
    if (question === null) return;
    const { settings } = question;
    const searches = gains.flatMap((gain) => {
      const value = settings[gain];
      if (value === null) return [];
      const search = stabilitySpan({ value, size: sizeOf(settings, gain), stableAt: (tried) => stableWith(question, gain, tried) });
      return [{ gain, search }];
    });
    let timer: ReturnType<typeof setTimeout>;
    const slice = () => {
      const end = performance.now() + SLICE_MS;
      while (searches.length > 0 && performance.now() < end) {
        const { gain, search } = searches[0];
        const step = search.next();
        if (!step.done) continue;
        searches.shift();
        setFound((before) => ({
          form: settings.form,
          spans: { ...(before.form === settings.form && before.spans), [gain]: step.value },
        }));
      }
      if (searches.length > 0) timer = setTimeout(slice, 10);
    };
    timer = setTimeout(slice, 60);
    return () => clearTimeout(timer);
  }, [gains, question]);
  return found.form === form ? found.spans : NOTHING_FOUND;
}
