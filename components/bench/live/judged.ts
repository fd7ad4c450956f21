import { headline, judgeCase } from '@/analysis/project';
import type { Analysis, Headline } from '@/contract';
import type { Settings } from '../draft/settings';
import type { BenchSubject } from '../subject/bench-subject';

/** What the numbers on the bench are worth: the same verdict that the server would give them. */
export function judged(subject: BenchSubject, settings: Settings, numbers: Analysis): Headline {
  const { plant, shownCase, opened } = subject;
  const sampled = opened?.sampling !== null && typeof opened?.sampling === 'object';
  const stated = { sampling: settings.statedContinuous || sampled, deadTime: plant.deadTimeBasis !== null };
  const { verdict, reason, checks } = judgeCase([], numbers, stated);
  const result = { case: { id: shownCase.id, name: shownCase.name }, verdict, reason, checks, numbers };
  return headline([result], { cases: [], operatingRange: [] });
}
