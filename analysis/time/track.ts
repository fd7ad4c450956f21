import type { LoopSystem } from './loop-system';
import { longPanelOperator } from './long-panel-operator';
import { isStablePanel } from './panel-stability';
import { PanelOperators, type PanelOperator } from './panel-operator';
import type { Stage } from './panel-plan';
import type { WorkBudget } from './work-budget';

/** A sequence of panels that a simulation runs through: again and again with dead time, once and for all without. */
export interface Track {
  /** How many panels stand in the delay line, one turn of the track; Infinity without dead time. */
  readonly panels: number;
  operatorAt(slot: number): PanelOperator;
}

/** The tracks of one loop, their operators made once and shared by all its responses. */
export class Tracks {
  readonly first: Track;
  private readonly operators: PanelOperators;
  private readonly even = new Map<number, Track | null>();

  constructor(
    private readonly system: LoopSystem,
    stages: readonly Stage[],
    budget: WorkBudget,
  ) {
    this.operators = new PanelOperators(system, budget);
    this.first = trackOf(stages.map(({ width, count }) => ({ count, make: () => this.operators.ofWidth(width) })));
  }

  /** Panels all of `width`, a whole fraction or multiple of the dead time; null where they would not stay stable. */
  evenTrack(width: number): Track | null {
    let track = this.even.get(width);
    if (track === undefined) {
      track = this.makeEven(width);
      this.even.set(width, track);
    }
    return track;
  }

  private makeEven(width: number): Track | null {
    const { deadTime } = this.system;
    const direct = this.operators.ofWidth(width);
    if (width < deadTime) return trackOf([{ make: () => direct, count: Math.round(deadTime / width) }]);
    const operator = width > deadTime ? longPanelOperator(direct, deadTime) : direct;
    return isStablePanel(operator) ? trackOf([{ make: () => operator, count: 1 }]) : null;
  }
}

interface Stretch {
  readonly count: number;
  /** Called when a simulation first gets there: most end before the last. */
  readonly make: () => PanelOperator;
}

function trackOf(stretches: readonly Stretch[]): Track {
  const ends: number[] = [];
  const operators: PanelOperator[] = [];
  const panels = stretches.reduce((sum, { count }, k) => (ends[k] = sum + count), 0);
  return {
    panels,
    operatorAt: (slot) => {
      let k = 0;
      while (slot >= ends[k]) k += 1;
      return (operators[k] ??= stretches[k].make());
    },
  };
}
