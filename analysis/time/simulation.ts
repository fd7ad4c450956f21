import { Curve } from './curve';
import type { LoopSystem } from './loop-system';
import { NODE_COUNT } from './nodes';
import { panelOperator, WATCHED, type PanelOperator } from './panel-operator';
import type { Stage } from './panel-plan';

/** One panel's operator in the order in which a plan uses them. */
export type OperatorAt = (index: number) => PanelOperator;

/** The operators of a plan, made once per stage and shared by every response of the loop. */
export function operatorsOf(system: LoopSystem, stages: readonly Stage[]): { at: OperatorAt; perPeriod: number } {
  const operators = stages.map((stage) => panelOperator(system, stage.width));
  const ends: number[] = [];
  stages.reduce((sum, stage, k) => (ends[k] = sum + stage.count), 0);
  const at = (index: number) => operators[ends.findIndex((end) => index < end)];
  return { at, perPeriod: ends.length ? ends[ends.length - 1] : 0 };
}

/**
 * One response from rest, panel after panel. Each panel is the exact exponential map of the state; the measurement that
 * comes round through the dead time stands in a delay line of one dead time and enters as its panel polynomial.
 */
export class Simulation {
  readonly output = new Curve();
  readonly control = new Curve();
  private time = 0;
  private slot = 0;
  private readonly state: Float64Array;
  private readonly delayLine: Float64Array;
  private readonly result: Float64Array;

  constructor(
    system: LoopSystem,
    private readonly operators: { at: OperatorAt; perPeriod: number },
    { initial, outputDelay }: { initial: Float64Array; outputDelay: number },
  ) {
    this.state = Float64Array.from(initial);
    this.delayLine = new Float64Array(system.deadTime > 0 ? operators.perPeriod * NODE_COUNT : 0);
    this.result = new Float64Array(WATCHED.length * NODE_COUNT + initial.length);
    this.outputDelay = outputDelay;
    if (outputDelay > 0) this.output.append({ start: 0, width: outputDelay }, new Float64Array(NODE_COUNT), 0);
  }

  private readonly outputDelay: number;

  get panels(): number {
    return this.control.panels;
  }

  /** Simulates until output and control are known up to `end`, or `maxPanels` is reached; says whether it got there. */
  advanceTo(end: number, maxPanels: number): boolean {
    while (this.time < end && this.panels < maxPanels) this.step();
    return this.time >= end;
  }

  private step(): void {
    const { width, matrix } = this.operators.at(this.slot);
    const size = this.state.length;
    const history = this.slot * NODE_COUNT;
    for (let i = 0; i < matrix.rows; i += 1) {
      const row = i * matrix.columns;
      let sum = 0;
      for (let j = 0; j < size; j += 1) sum += matrix.data[row + j] * this.state[j];
      for (let j = size; j < matrix.columns; j += 1) sum += matrix.data[row + j] * this.delayLine[history + j - size];
      this.result[i] = sum;
    }
    this.output.append({ start: this.time + this.outputDelay, width }, this.result, 0);
    this.control.append({ start: this.time, width }, this.result, NODE_COUNT);
    if (this.delayLine.length) this.delayLine.set(this.result.subarray(2 * NODE_COUNT, 3 * NODE_COUNT), history);
    this.state.set(this.result.subarray(WATCHED.length * NODE_COUNT));
    this.time += width;
    this.slot += 1;
    if (this.delayLine.length && this.slot === this.operators.perPeriod) this.slot = 0;
  }
}
