import { memo, useDeferredValue, useMemo } from 'react';
import {
  type FrequencyAxis,
  frequencyAxis,
  frequencyWindow,
  type Interval,
  type LoopScene,
  magnitudePanel,
  type PanelPicture,
  phasePanel,
  type Rect,
  sensitivityPanel,
  stackLayout,
  stackMargins,
} from '@/figures';
import { ChartShell } from './chart-shell';
import type { FrequencyPanel, LoopChartProps } from './chart-types';
import { describeFrequency } from './describe';
import { FrequencyFoot } from './foot-axis';
import { FrequencyCursor } from './frequency-cursor';
import { Layer } from './layer';
import { PanelView } from './panel-view';
import { frequencyTable } from './tables';
import { UnstableMark } from './unstable-mark';
import { useChartFrame } from './use-chart-frame';
import { useSteadyInterval } from './use-steady-interval';

export interface FrequencySheetProps extends LoopChartProps {
  /** From top to foot; all three where absent. */
  panels?: readonly FrequencyPanel[];
  height: number;
  /** Measured where absent. */
  width?: number;
  /** rad/s; chosen round crossovers and peaks where absent. */
  window?: Interval;
}

const allPanels: readonly FrequencyPanel[] = ['magnitude', 'phase', 'sensitivity'];
const weights: Record<FrequencyPanel, number> = { magnitude: 1.1, phase: 1.05, sensitivity: 1 };
const builders: Record<FrequencyPanel, (scene: LoopScene, across: FrequencyAxis, plot: Rect) => PanelPicture> = {
  magnitude: magnitudePanel,
  phase: phasePanel,
  sensitivity: sensitivityPanel,
};

/** |L|, arg L, |S| and |T| in a stack over one logarithmic axis, with margins, peaks and the cursor that all charts share. */
export const FrequencySheet = memo(function FrequencySheet(props: FrequencySheetProps) {
  const { a, b, others, limits, units, panels: kinds = allPanels, height, width: fixed, window } = props;
  const { width, onLayout } = useChartFrame(fixed);
  const scene = useMemo(() => ({ a, b, others, limits, units }), [a, b, others, limits, units]);
  const wanted = useMemo(
    () => window ?? frequencyWindow(b === undefined ? [a.analysis] : [a.analysis, b.analysis], units.frequency),
    [a, b, units.frequency, window],
  );
  const domain = useSteadyInterval(wanted, Math.log10);
  const layout = useMemo(
    () =>
      stackLayout(
        width,
        height,
        kinds.map((kind) => weights[kind]),
      ),
    [width, height, kinds],
  );
  const across = useMemo(
    () => frequencyAxis(domain, [stackMargins.left, Math.max(stackMargins.left + 1, width - stackMargins.right)], units.frequency),
    [domain, width, units.frequency],
  );
  const panels = useMemo(
    () => kinds.map((kind, i) => ({ kind, picture: builders[kind](scene, across, layout.plots[i]) })),
    [kinds, scene, across, layout],
  );
  // What is read of the chart follows its curves when there is time.
  const read = useDeferredValue(useMemo(() => ({ scene, panels }), [scene, panels]));
  const columns = useMemo(() => across.labelled.map(({ x }) => x), [across]);
  const stable = a.analysis.closedLoop.stable;
  const picture = (
    <Layer width={width} height={height}>
      {panels.map((panel) => (
        <PanelView key={panel.kind} picture={panel.picture} columns={columns} />
      ))}
      <FrequencyFoot axis={across} y={layout.foot} />
      {stable ? null : <UnstableMark x={width - 60} y={12} />}
    </Layer>
  );
  return (
    <ChartShell
      name="the loop over frequency"
      description={describeFrequency(read.scene)}
      height={height}
      onLayout={onLayout}
      picture={width > 0 ? picture : null}
      overlay={width > 0 ? <FrequencyCursor {...read} across={across} size={layout} /> : null}
      table={() => frequencyTable(scene, domain)}
    />
  );
});
