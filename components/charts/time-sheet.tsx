import { memo, useDeferredValue, useMemo } from 'react';
import { type Interval, stackLayout, stackMargins, timeAxis, timePanel, timeWindow } from '@/figures';
import { ChartShell } from './chart-shell';
import type { LoopChartProps, TimePanel } from './chart-types';
import { describeTime } from './describe';
import { TimeFoot } from './foot-axis';
import { Layer } from './layer';
import { PanelView } from './panel-view';
import { timeTable } from './tables';
import { TimeCursor } from './time-cursor';
import { UnstableMark } from './unstable-mark';
import { useChartFrame } from './use-chart-frame';
import { useSteadyInterval } from './use-steady-interval';

export interface TimeSheetProps extends Omit<LoopChartProps, 'others'> {
  /** From top to foot, each with its title and unit; a panel's height is its weight in the stack, 1 where absent. */
  panels: readonly TimePanel[];
  height: number;
  /** Where the axis ends, s; chosen from A's responses where absent. */
  end?: number;
  /** Measured where absent. */
  width?: number;
}

const itself = (value: number): number => value;

/** Reference step, load step and control in a stack over one time axis, with their own cursor. */
export const TimeSheet = memo(function TimeSheet({ a, b, limits, units, panels: asked, height, end, width: fixed }: TimeSheetProps) {
  const { width, onLayout } = useChartFrame(fixed);
  const scene = useMemo(() => ({ a, b, limits, units }), [a, b, limits, units]);
  const wanted = useMemo(() => timeWindow(a.analysis), [a]);
  const steady = useSteadyInterval(wanted, itself);
  const domain = useMemo<Interval>(() => (end === undefined ? steady : [0, end]), [steady, end]);
  const layout = useMemo(
    () =>
      stackLayout(
        width,
        height,
        asked.map((panel) => panel.height ?? 1),
      ),
    [width, height, asked],
  );
  const across = useMemo(
    () => timeAxis(domain[1], [stackMargins.left, Math.max(stackMargins.left + 1, width - stackMargins.right)]),
    [domain, width],
  );
  const panels = useMemo(
    () => asked.map((panel, i) => ({ panel, picture: timePanel(scene, panel, across, layout.plots[i]) })),
    [asked, scene, across, layout],
  );
  // What is read of the chart follows its curves when there is time.
  const read = useDeferredValue(useMemo(() => ({ scene, panels }), [scene, panels]));
  const columns = useMemo(() => across.ticks.filter(({ text }) => text !== null).map(({ x }) => x), [across]);
  const stable = a.analysis.closedLoop.stable;
  const picture = (
    <Layer width={width} height={height}>
      {panels.map(({ panel, picture: drawn }) => (
        <PanelView key={panel.kind} picture={drawn} columns={columns} />
      ))}
      <TimeFoot axis={across} y={layout.foot} />
      {stable ? null : <UnstableMark x={width - 60} y={12} />}
    </Layer>
  );
  return (
    <ChartShell
      name={asked.map(({ title }) => title).join(', ')}
      description={describeTime(read.scene, asked)}
      height={height}
      onLayout={onLayout}
      picture={width > 0 ? picture : null}
      overlay={width > 0 ? <TimeCursor {...read} across={across} size={layout} /> : null}
      table={() => timeTable(scene, asked, domain)}
    />
  );
});
