import type { Point, Rect } from './geometry';
import type { Axis } from './linear-axis';

export interface LapDemand {
  readonly bound: 'min' | 'max';
  /** In the reader's unit. */
  readonly limit: number;
  /** "at most 1.70" */
  readonly text: string;
}

/** What stands at the right end of a line or a limit. */
export interface LapName extends Point {
  readonly text: string;
  readonly tone: 'strong' | 'quiet' | 'limit';
}

interface Named {
  readonly lines: readonly { readonly name: string; readonly points: readonly Point[]; readonly strong: boolean }[];
  readonly demands: readonly LapDemand[];
  readonly axis: Axis;
  readonly plot: Rect;
}

const PITCH = 15;
const AWAY = 10;
const BASELINE = 4.5;

/** First those that must be named; the others where there is room left. */
const rank = { limit: 0, strong: 1, quiet: 2 };

/** Moves names apart, none further than its neighbours push it. */
function spread(names: readonly LapName[], { y, height }: Rect): LapName[] {
  const room = Math.max(1, Math.floor(height / PITCH));
  const kept = [...names]
    .sort((a, b) => rank[a.tone] - rank[b.tone])
    .slice(0, room)
    .sort((a, b) => a.y - b.y);
  let free = y;
  const down = kept.map((name) => {
    const at = Math.max(name.y, free);
    free = at + PITCH;
    return { ...name, y: at };
  });
  let limit = y + height + BASELINE;
  return down
    .reverse()
    .map((name) => {
      const at = Math.min(name.y, limit);
      limit = at - PITCH;
      return { ...name, y: at };
    })
    .reverse();
}

/** The names of loads and limits at the right of the plot, each as near its line as the others let it. */
export function lapNames({ lines, demands, axis, plot }: Named): LapName[] {
  const x = plot.x + plot.width + AWAY;
  const loads = lines.flatMap(({ name, points, strong }): LapName[] => {
    const last = points.findLast((point) => Number.isFinite(point.y));
    return last === undefined || name === '' ? [] : [{ x, y: last.y + BASELINE, text: name, tone: strong ? 'strong' : 'quiet' }];
  });
  const limits = demands.map(({ limit, text }): LapName => ({ x, y: axis.at(limit) + BASELINE, text, tone: 'limit' }));
  return spread([...limits, ...loads], plot);
}
