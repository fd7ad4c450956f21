import type { Complex } from '@/analysis/numbers/complex';
import { scaledBy, type Matrix } from '@/analysis/numbers/matrix';
import { ExponentialChanges } from '@/analysis/numbers/matrix-exponential';
import { NODES, NODE_COUNT } from '@/analysis/time/nodes';
import { planPanels } from '@/analysis/time/panel-plan';
import { dot, rowAfter } from './rows';
import type { StateEquations } from './state-equations';

/** Panels of one width: what the state gives at their nodes, and the state at their end. */
interface Stage {
  readonly width: number;
  readonly count: number;
  /** NODE_COUNT rows over the state. */
  readonly nodeRows: readonly Float64Array[];
  /** State at the end less state at the start. */
  readonly change: Matrix;
}

/**
 * A stretch of time with the input held, cut into panels that follow the plant's output: narrow while what the input woke is
 * fast, wider as that dies out. States carry the held input as their last entry.
 */
export class HeldPanels {
  private readonly stages: readonly Stage[];
  private readonly values = new Float64Array(NODE_COUNT);
  private readonly moved: Float64Array;

  constructor({ dynamics, outputs }: StateEquations, poles: readonly Complex[], length: number) {
    this.moved = new Float64Array(dynamics.rows);
    this.stages = planPanels(poles, length).map(({ width, count }) => {
      const changes = new ExponentialChanges(dynamics.rows, Array.from(NODES.subarray(1))).of(scaledBy(dynamics, width));
      const nodeRows = [outputs[0], ...changes.map((change) => rowAfter(outputs[0], change))];
      return { width, count, nodeRows, change: changes[NODE_COUNT - 2] };
    });
  }

  /** How many there are. */
  get count(): number {
    return this.stages.reduce((sum, { count }) => sum + count, 0);
  }

  /** Carries the state from `start` to the end of the stretch, and hands over the output of every panel on the way. */
  pass(state: Float64Array, start: number, append: (start: number, width: number, values: Float64Array) => void): void {
    let time = start;
    for (const { width, count, nodeRows, change } of this.stages) {
      for (let k = 0; k < count; k += 1) {
        for (let i = 0; i < NODE_COUNT; i += 1) this.values[i] = dot(nodeRows[i], state);
        append(time, width, this.values);
        this.advance(state, change);
        time += width;
      }
    }
  }

  private advance(state: Float64Array, { rows, data }: Matrix): void {
    const { moved } = this;
    for (let i = 0; i < rows; i += 1) {
      let sum = 0;
      for (let j = 0; j < rows; j += 1) sum += data[i * rows + j] * state[j];
      moved[i] = sum;
    }
    for (let i = 0; i < rows; i += 1) state[i] += moved[i];
  }
}
