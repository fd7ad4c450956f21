import type { LoopSystem } from './loop-system';
import { longPanelOperator } from './long-panel-operator';
import { panelOperator, type PanelOperator } from './panel-operator';
import type { Stage } from './panel-plan';

/** A sequence of panels that a simulation runs through: again and again with dead time, once and for all without. */
export interface Track {
  /** How many panels stand in the delay line, one turn of the track; Infinity without dead time. */
  readonly panels: number;
  operatorAt(slot: number): PanelOperator;
}

/** The tracks of one loop, their operators made once and shared by all its responses. */
export class Tracks {
  readonly first: Track;
  private readonly even = new Map<number, Track>();

  constructor(
    private readonly system: LoopSystem,
    stages: readonly Stage[],
  ) {
    this.first = trackOf(stages.map(({ width, count }) => ({ operator: panelOperator(system, width), count })));
  }

  /** Panels all of `width`: a whole fraction of the dead time, or a whole multiple of it. */
  evenTrack(width: number): Track {
    let track = this.even.get(width);
    if (!track) {
      const { deadTime } = this.system;
      const base = panelOperator(this.system, width);
      track =
        width > deadTime
          ? trackOf([{ operator: longPanelOperator(base, deadTime), count: 1 }])
          : trackOf([{ operator: base, count: Math.round(deadTime / width) }]);
      this.even.set(width, track);
    }
    return track;
  }
}

function trackOf(stages: readonly { operator: PanelOperator; count: number }[]): Track {
  const ends: number[] = [];
  const panels = stages.reduce((sum, { count }, k) => (ends[k] = sum + count), 0);
  return { panels, operatorAt: (slot) => stages[ends.findIndex((end) => slot < end)].operator };
}
