import type { Complex } from '@/analysis/numbers/complex';
import { scaledBy } from '@/analysis/numbers/matrix';
import { ExponentialChanges } from '@/analysis/numbers/matrix-exponential';
import { Curve } from '@/analysis/time/curve';
import type { Running } from '@/analysis/time/horizon';
import { NODE_COUNT } from '@/analysis/time/nodes';
import type { WorkBudget } from '@/analysis/time/work-budget';
import type { ActuatorLimits } from './actuator-limits';
import { ControllerRun } from './controller-run';
import type { DifferenceEquation } from './difference-equation';
import { HeldPanels } from './held-panels';
import { dot, rowAfter } from './rows';
import type { SplitDelay } from './split-delay';
import type { StateEquations } from './state-equations';

/** What a panel of a curve costs: it is computed, and knots, integrals and drawing read it again. */
const WORK_PER_PANEL = 700;

/** The continuous half of a sampled loop: plant and sensor, and where their delays stand. */
export interface ContinuousHalf {
  /** Plant, then sensor. */
  readonly equations: StateEquations;
  /** Modes that the curve is to follow between samples. */
  readonly poles: readonly Complex[];
  /** From the command to the sample: plant, sensor and computation, in sample periods. */
  readonly delay: SplitDelay;
  /** s */
  readonly computationDelay: number;
  /** s */
  readonly plantDeadTime: number;
}

export interface StepSizes {
  readonly reference: number;
  readonly load: number;
}

interface Course {
  readonly half: ContinuousHalf;
  readonly equation: DifferenceEquation;
  /** One of them is 0. */
  readonly sizes: StepSizes;
  /** null: the linear response. */
  readonly limits: ActuatorLimits | null;
  readonly budget: WorkBudget;
}

/**
 * One response of a sampled loop from rest, exact at and between the samples. Its curves are per unit of the step.
 *
 * The plant is followed on a clock on which its input changes at whole periods: the sample's time plus the computation delay.
 * A delay of n periods and a rest r means that sample k reads the sensor at the share 1 − r of the plant's period k − n − 1.
 */
export class SampledSimulation implements Running {
  readonly output = new Curve();
  readonly control = new Curve();
  private readonly controller: ControllerRun;
  private readonly heldPanels: HeldPanels;
  private readonly state: Float64Array;
  /** Reads the sample off the state at the start of the period in which it is taken. */
  private readonly sampleRow: Float64Array;
  private readonly samples: number[] = [];
  private readonly limitedSince: number[] = [];
  private readonly heldCommand = new Float64Array(NODE_COUNT);
  private readonly half: ContinuousHalf;
  private readonly equation: DifferenceEquation;
  private readonly sizes: StepSizes;
  private readonly budget: WorkBudget;
  private k = 0;

  constructor({ half, equation, sizes, limits, budget }: Course) {
    const { equations, poles, delay } = half;
    this.half = half;
    this.equation = equation;
    this.sizes = sizes;
    this.budget = budget;
    this.controller = new ControllerRun(equation, limits);
    this.heldPanels = new HeldPanels(equations, poles, equation.period);
    this.state = new Float64Array(equations.dynamics.rows);
    this.sampleRow = this.sensorRow(delay.rest === 0 ? 0 : 1 - delay.rest);
    this.beforeFirstCommand();
  }

  get panels(): number {
    return this.output.panels;
  }

  /** @throws OutOfWork */
  advanceTo(end: number, most: { panels: number; size: number }): boolean {
    const { period } = this.equation;
    const { computationDelay } = this.half;
    while (
      this.k * period + computationDelay < end &&
      this.panels < most.panels &&
      this.output.size < most.size &&
      this.control.size < most.size
    )
      this.next();
    return this.k * period + computationDelay >= end;
  }

  /** How long the actuator held the command back before `end`, s. */
  timeAtLimits(end: number): number {
    return this.limitedSince.filter((start) => start < end).length * this.equation.period;
  }

  /** Whether the actuator holds the latest command back. */
  get isLimited(): boolean {
    return this.controller.isLimited;
  }

  /** From sample k to the next. */
  private next(): void {
    const { half, equation, sizes, state, k } = this;
    const command = this.controller.step(sizes.reference, this.sampleNow());
    this.hold(command + sizes.load);
    if (!this.isImmediate) this.takeSample(k, dot(this.sampleRow, state));
    const start = k * equation.period + half.computationDelay;
    if (this.controller.isLimited) this.limitedSince.push(start);
    this.control.append(start, equation.period, this.heldCommand.fill(command / this.unit), 0);
    this.follow(this.heldPanels, start + half.plantDeadTime);
    this.k = k + 1;
  }

  /** Whether a sample sees the command that it itself asks for: no delay at all. */
  private get isImmediate(): boolean {
    const { periods, rest } = this.half.delay;
    return periods === 0 && rest === 0;
  }

  /** Sample k: what was read a delay ago, or, without delay, what plant and controller agree upon. */
  private sampleNow(): number {
    if (!this.isImmediate) return this.samples[this.k] ?? 0;
    const { sizes, sampleRow, state, controller } = this;
    this.hold(0);
    const own = dot(sampleRow, state);
    this.hold(1);
    const direct = dot(sampleRow, state) - own;
    const atRest = controller.preview(sizes.reference, 0);
    const slope = atRest - controller.preview(sizes.reference, 1);
    const agreed = (own + direct * (atRest + sizes.load)) / (1 + direct * slope);
    const command = controller.withinLimits(atRest - slope * agreed);
    return own + direct * (command + sizes.load);
  }

  private takeSample(period: number, value: number): void {
    const { periods, rest } = this.half.delay;
    this.samples[period + periods + (rest > 0 ? 1 : 0)] = value;
  }

  /** Carries the plant over a stretch with its input held. @throws OutOfWork */
  private follow(panels: HeldPanels, start: number): void {
    this.budget.spend((panels.count + 1) * WORK_PER_PANEL);
    panels.pass(this.state, start, this.appendOutput);
  }

  private hold(input: number): void {
    const { inputScale } = this.half.equations;
    this.state[this.state.length - 1] = input / inputScale;
  }

  private get unit(): number {
    return this.sizes.reference || this.sizes.load;
  }

  private readonly appendOutput = (start: number, width: number, values: Float64Array): void => {
    const { unit } = this;
    if (unit !== 1) for (let i = 0; i < values.length; i += 1) values[i] /= unit;
    this.output.append(start, width, values, 0);
  };

  private sensorRow(share: number): Float64Array {
    const { dynamics, output } = this.half.equations;
    if (share === 0) return output;
    const [change] = new ExponentialChanges(dynamics.rows, [share]).of(scaledBy(dynamics, this.equation.period));
    return rowAfter(output, change);
  }

  /** Until the first command arrives nothing happens, but for a load, which needs no computation. */
  private beforeFirstCommand(): void {
    const { computationDelay, plantDeadTime } = this.half;
    const quiet = this.sizes.load === 0 ? computationDelay + plantDeadTime : plantDeadTime;
    if (computationDelay > 0) this.control.append(0, computationDelay, new Float64Array(NODE_COUNT), 0);
    if (quiet > 0) this.output.append(0, quiet, new Float64Array(NODE_COUNT), 0);
    if (this.sizes.load !== 0 && computationDelay > 0) this.loadAlone();
  }

  /** The load's own effect before the first command: a part of a period, then whole ones. */
  private loadAlone(): void {
    const { period } = this.equation;
    const { equations, poles, delay, computationDelay, plantDeadTime } = this.half;
    const whole = Math.floor(computationDelay / period);
    const part = computationDelay - whole * period;
    const read = delay.rest === 0 ? 0 : 1 - delay.rest;
    const begins = 1 - part / period;
    this.hold(this.sizes.load);
    if (part > 0) {
      if (read > begins) this.takeSample(-whole - 1, dot(this.sensorRow(read - begins), this.state));
      this.follow(new HeldPanels(equations, poles, part), plantDeadTime);
    }
    for (let j = -whole; j < 0; j += 1) {
      this.takeSample(j, dot(this.sampleRow, this.state));
      this.follow(this.heldPanels, plantDeadTime + computationDelay + j * period);
    }
  }
}
