import type { LoopSystem } from './loop-system';
import { longPanelOperator } from './long-panel-operator';
import { isStablePanel } from './panel-stability';
import { panelOperator, type PanelOperator } from './panel-operator';
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
  private readonly even = new Map<number, Track | null>();

  constructor(
    private readonly system: LoopSystem,
    stages: readonly Stage[],
    private readonly budget: WorkBudget,
  ) {
    this.first = trackOf(stages.map(({ width, count }) => ({ operator: panelOperator(system, width, budget), count })));
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
    const direct = panelOperator(this.system, width, this.budget);
    if (width < deadTime) return trackOf([{ operator: direct, count: Math.round(deadTime / width) }]);
    const operator = width > deadTime ? longPanelOperator(direct, deadTime) : direct;
    return isStablePanel(operator) ? trackOf([{ operator, count: 1 }]) : null;
  }
}

function trackOf(stages: readonly { operator: PanelOperator; count: number }[]): Track {
  const ends: number[] = [];
  const panels = stages.reduce((sum, { count }, k) => (ends[k] = sum + count), 0);
  return { panels, operatorAt: (slot) => stages[ends.findIndex((end) => slot < end)].operator };
}
