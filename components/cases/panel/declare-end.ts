import type { Edge, OperatingRange } from '@/contract';

export interface Declaration extends Pick<Edge, 'axis' | 'end'> {
  readonly physical: boolean;
  /** Where the loop lets go and takes up again, m/s; undefined leaves what was said. */
  readonly disengage?: number | null;
  readonly engage?: number | null;
}

/** The operating range with one end declared, or taken back. Every other end stays as it is. */
export function declareEnd(ranges: readonly OperatingRange[], { axis, end, physical, disengage, engage }: Declaration): OperatingRange[] {
  const before = ranges.find((range) => range.axis === axis);
  const range: OperatingRange = before ?? { axis, engage: null, disengage: null, lowIsPhysical: false, highIsPhysical: false };
  const changed = {
    ...range,
    ...(disengage === undefined ? {} : { disengage }),
    ...(engage === undefined ? {} : { engage }),
    ...(end === 'low' ? { lowIsPhysical: physical } : { highIsPhysical: physical }),
  };
  return before ? ranges.map((one) => (one === before ? changed : one)) : [...ranges, changed];
}
