import type { Project } from '@/contract';

/** One sentence on what a project needs next, from what its list knows of it. */
export function nextStep({ headline, archived }: Pick<Project, 'headline' | 'archived'>): string {
  if (archived) return 'Archived. Nothing changes in it.';
  if (!headline) return 'Enter the plant, then choose gains.';
  if (headline.unstableCases > 0) return 'The loop is not stable. Open it on the bench.';
  if (headline.verdict === 'fail') return `A limit is not met. Open it on the bench.`;
  if (headline.verdict === 'tight') return 'Limits are met, a target is missed.';
  if (headline.verdict === 'notJudged') return 'Read its margins on the bench.';
  return 'Targets are met.';
}
