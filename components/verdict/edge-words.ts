import type { Headline } from '@/contract';

/** "at the edge of what was checked", and whether every end that the case stands at was declared physical; null away from the edges. */
export function edgeWords({ edges }: Pick<Headline, 'edges'>): string | null {
  if (edges.length === 0) return null;
  return `at the edge of what was checked${edges.every(({ physical }) => physical) ? ', declared' : ''}`;
}
