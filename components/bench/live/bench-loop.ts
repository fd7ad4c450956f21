import { caseLoop } from '@/analysis/project';
import type { Loop } from '@/contract';

import { contentWith, type Settings } from '../draft/settings';
import type { BenchSubject } from '../subject/bench-subject';

/** Sizes of the steps whose responses are drawn. They are how one looks, not part of the design. */
export interface StepSizes {
  readonly reference: number;
  readonly load: number;
}

/** What the engine is asked: the loop, and the settings that it was made of. */
export interface BenchQuestion {
  readonly settings: Settings;
  readonly loop: Loop;
}

type LoopParts = Pick<BenchSubject, 'plant' | 'shownCase' | 'opened'>;

/** The loop that `settings` make in the case that is shown. */
export function benchLoop(subject: LoopParts, settings: Settings, steps: StepSizes): Loop {
  const { plant, shownCase, opened } = subject;
  const loop = caseLoop({ plant, parameters: shownCase.parameters }, contentWith(opened, settings));
  return { ...loop, responses: { ...loop.responses, referenceStep: steps.reference, loadStep: steps.load } };
}
