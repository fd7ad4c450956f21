/** The value below which this share of the numbers lies, linearly between neighbours; 0.5 is the median. */
export function quantile(numbers: readonly number[], share: number): number {
  const sorted = [...numbers].sort((a, b) => a - b);
  const place = share * (sorted.length - 1);
  const below = Math.floor(place);
  return sorted[below] + (sorted[Math.min(below + 1, sorted.length - 1)] - sorted[below]) * (place - below);
}

export const median = (numbers: readonly number[]): number => quantile(numbers, 0.5);
