type Value = number | null | undefined;

/** Tolerances of one comparison: the larger of the two counts; both 0 asks for the same number. */
export interface Tolerance {
  readonly relative?: number;
  readonly absolute?: number;
}

const near = (got: Value, wanted: number, { relative = 0, absolute = 0 }: Tolerance) =>
  typeof got === 'number' && Math.abs(got - wanted) <= Math.max(relative * Math.abs(wanted), absolute);

/** What a comparison found wrong, each a line with both numbers, so that one run tells everything. */
export class Misses {
  readonly lines: string[] = [];

  /** Absence must meet absence. */
  compare(name: string, got: Value, wanted: Value, tolerance: Tolerance = {}): void {
    const agree = wanted == null ? got == null : near(got, wanted, tolerance);
    this.unless(agree, `${name}: got ${got}, wanted ${wanted}`);
  }

  unless(condition: boolean, line: string): void {
    if (!condition) this.lines.push(line);
  }
}
