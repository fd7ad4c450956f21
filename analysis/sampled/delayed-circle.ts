import { AxisProduct } from '@/analysis/loop/axis-product';
import { limitOf } from '@/analysis/margins/end-values';
import { multiply } from '@/analysis/numbers/polynomial';
import type { SampledModel } from './sampled-model';

/** A point of the unit circle: everything of L there that no delay changes. */
export interface CirclePoint {
  readonly omega: number;
  /** w = e^(jωh) − 1. */
  readonly wRe: number;
  readonly wIm: number;
  /** Controller, filters, one period of delay and the plant's denominator. */
  readonly restRe: number;
  readonly restIm: number;
}

/**
 * How the second variable leads from one delay to another: through the delays between two whole periods, or, with a plant that
 * answers at once, through the jump that L makes where a delay passes a whole period.
 */
export type Path = 'between' | 'jump';

/**
 * L of a sampled loop as a function of two variables: the frequency, and the part `rest` of the delay beyond whole periods, in
 * periods from 0 to 1. Whole periods only turn L by e^(−jωh) each and are left out; `rest` = 1 is one period more than 0.
 * On the path of a jump `rest` leads from L at a delay of whole periods to L just past it.
 */
export class DelayedCircle {
  re = 0;
  im = 0;
  private readonly command: AxisProduct;

  constructor(
    private readonly model: SampledModel,
    private readonly path: Path,
  ) {
    this.command = new AxisProduct([model.controller, model.filters]);
  }

  get end(): number {
    return Math.PI / this.model.period;
  }

  point(omega: number): CirclePoint {
    const { command } = this;
    const isEnd = omega >= this.end;
    const angle = isEnd ? Math.PI : omega * this.model.period;
    const half = Math.sin(angle / 2);
    const [wRe, wIm] = [-2 * half * half, isEnd ? 0 : Math.sin(angle)];
    if (!isEnd) command.evaluate(Math.tan(angle / 2));
    let [re, im] = isEnd ? [limitOf(command.atInfinity, 'infinity'), 0] : [command.re, command.im];
    [re, im] = [re * (1 + wRe) + im * wIm, im * (1 + wRe) - re * wIm];
    for (const pole of this.model.held.poles) {
      const [x, y] = [wRe - pole.re, wIm - pole.im];
      const square = x * x + y * y;
      [re, im] = [(re * x + im * y) / square, (im * x - re * y) / square];
    }
    return { omega, wRe, wIm, restRe: re, restIm: im };
  }

  /** What a rest adds to the delay, in periods: nothing on the way through a jump. */
  delayOf(rest: number): number {
    return this.path === 'jump' ? 0 : rest;
  }

  /** Numerators of the held plant for each rest in [0, 1]. */
  numerators(rests: readonly number[]): number[][] {
    const { held } = this.model;
    if (this.path === 'jump') {
      const [before, after] = [multiply(held.atSample(), [1, 1]), [0, ...held.after([1])[0]]];
      return rests.map((rest) => before.map((c, i) => (1 - rest) * c + rest * after[i]));
    }
    const between = held.after(rests.filter((rest) => rest < 1).map((rest) => 1 - rest));
    return rests.map((rest) => (rest < 1 ? between.shift()! : held.atSample()));
  }

  /** Writes L into `re` and `im`. */
  evaluate({ wRe, wIm, restRe, restIm }: CirclePoint, numerator: readonly number[]): void {
    let [re, im] = [0, 0];
    for (const c of numerator) [re, im] = [re * wRe - im * wIm + c, re * wIm + im * wRe];
    this.re = re * restRe - im * restIm;
    this.im = re * restIm + im * restRe;
  }

  /** ln|L| at a point. */
  logAt(point: CirclePoint, numerator: readonly number[]): number {
    this.evaluate(point, numerator);
    return 0.5 * Math.log(this.re * this.re + this.im * this.im);
  }
}
