import type { Matrix } from '@/analysis/numbers/matrix';
import { Curve } from './curve';
import type { LoopSystem } from './loop-system';
import { NODE_COUNT } from './nodes';
import { WATCHED } from './panel-operator';
import { renode } from './renode';
import type { Track, Tracks } from './track';
import type { WorkBudget } from './work-budget';

/** Turns of a track before wider panels are tried; doubled each time they do not do. */
const TURNS_BETWEEN_TRIALS = 4;

/** What a panel costs beside its map: three curves grow by it, and knots, integrals and drawing read it again. */
const WORK_BESIDE_MAP = 2000;

interface Run {
  readonly system: LoopSystem;
  readonly tracks: Tracks;
  /** The state just after the step. */
  readonly initial: Float64Array;
  /** The part of the dead time that stands between the simulated output and the watched one. */
  readonly outputDelay: number;
  /** Whether panels may widen as the response calms down. */
  readonly widening: boolean;
  readonly budget: WorkBudget;
}

/**
 * One response from rest, panel after panel. Each panel is the exact exponential map of the state; the measurement that
 * comes round through the dead time stands in a delay line and enters as its panel polynomials.
 *
 * The first track resolves what jumps wake within one dead time. As the response grows smooth, panels widen to the dead
 * time and past it, each time only where the wider panels give back what was just simulated.
 */
export class Simulation {
  readonly output = new Curve();
  readonly control = new Curve();
  private readonly measurement = new Curve();
  private time = 0;
  private slot = 0;
  private turns = 0;
  private turnsToTrial = TURNS_BETWEEN_TRIALS;
  private track: Track;
  private delayLine: Float64Array;
  private readonly state: Float64Array;
  private readonly result: Float64Array;

  constructor(private readonly run: Run) {
    const { system, tracks, initial, outputDelay } = run;
    this.track = tracks.first;
    this.delayLine = new Float64Array(system.deadTime > 0 ? this.track.panels * NODE_COUNT : 0);
    this.state = Float64Array.from(initial);
    this.result = new Float64Array(WATCHED.length * NODE_COUNT + initial.length);
    if (outputDelay > 0) this.output.append(0, outputDelay, new Float64Array(NODE_COUNT), 0);
  }

  get panels(): number {
    return this.control.panels;
  }

  /**
   * Simulates until output and control are known up to `end`, or until there are `panels` of them or a signal passes
   * `size`; says whether it got there.
   * @throws OutOfWork
   */
  advanceTo(end: number, most: { panels: number; size: number }): boolean {
    while (this.time < end && this.panels < most.panels && this.output.size < most.size && this.control.size < most.size) {
      this.step();
      if (this.slot === this.track.panels) this.endTurn();
    }
    return this.time >= end;
  }

  private step(): void {
    const { width, matrix } = this.track.operatorAt(this.slot);
    const { state, result, delayLine } = this;
    this.run.budget.spend(matrix.data.length + WORK_BESIDE_MAP);
    const history = this.slot * NODE_COUNT;
    this.map(matrix, history);
    this.output.append(this.time + this.run.outputDelay, width, result, 0);
    this.control.append(this.time, width, result, NODE_COUNT);
    if (delayLine.length > 0) {
      this.measurement.append(this.time, width, result, 2 * NODE_COUNT);
      for (let i = 0; i < NODE_COUNT; i += 1) delayLine[history + i] = result[2 * NODE_COUNT + i];
    }
    const first = matrix.rows - state.length;
    for (let i = 0; i < state.length; i += 1) state[i] = result[first + i];
    this.time += width;
    this.slot += 1;
  }

  /** The operator times the state and what comes out of the delay line from `history` on. */
  private map({ data, rows, columns }: Matrix, history: number): void {
    const { state, result, delayLine } = this;
    const order = state.length;
    for (let i = 0, place = 0; i < rows; i += 1) {
      let sum = 0;
      for (let j = 0; j < order; j += 1, place += 1) sum += data[place] * state[j];
      for (let j = history; j < history + columns - order; j += 1, place += 1) sum += data[place] * delayLine[j];
      result[i] = sum;
    }
  }

  private endTurn(): void {
    this.slot = 0;
    this.turns += 1;
    if (!this.run.widening || this.turns < this.turnsToTrial) return;
    const widened = this.widerWidths().some((width) => this.widenTo(width));
    this.turnsToTrial = widened ? TURNS_BETWEEN_TRIALS : 2 * this.turnsToTrial;
    this.turns = 0;
  }

  /** The dead time or its largest even parts that are wider than what is run; past it, twice what is run. */
  private widerWidths(): number[] {
    const { deadTime } = this.run.system;
    if (this.track.panels === 1) return [2 * this.track.operatorAt(0).width];
    const widths: number[] = [];
    for (let parts = 1; parts <= this.track.panels / 2; parts *= 2) widths.push(deadTime / parts);
    return widths;
  }

  private widenTo(width: number): boolean {
    const count = Math.max(1, Math.round(this.run.system.deadTime / width));
    const history = renode(this.measurement, width, count);
    if (!history || !renode(this.output, width, count) || !renode(this.control, width, count)) return false;
    const track = this.run.tracks.evenTrack(width);
    if (!track) return false;
    this.track = track;
    this.delayLine = history;
    return true;
  }
}
