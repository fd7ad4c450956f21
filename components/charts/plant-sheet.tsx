import { memo, useMemo } from 'react';
import { frequencyAxis, plantMagnitudePanel, plantPhasePanel, type PlantScene, plantWindow, stackLayout, stackMargins } from '@/figures';
import { ChartShell } from './chart-shell';
import { FrequencyFoot } from './foot-axis';
import { Layer } from './layer';
import { PanelView } from './panel-view';
import { PlantCursor } from './plant-cursor';
import { describePlantCurves, plantTable } from './plant-words';
import { useChartFrame } from './use-chart-frame';

export interface PlantSheetProps extends PlantScene {
  height: number;
  /** Measured where absent. */
  width?: number;
}

const weights = [1, 1];

/** |P| and arg P over one logarithmic axis: what a plant does by itself, so without margins. */
export const PlantSheet = memo(function PlantSheet({ curves, corners, at, units, height, width: fixed }: PlantSheetProps) {
  const { width, onLayout } = useChartFrame(fixed);
  const scene = useMemo(() => ({ curves, corners, at, units }), [curves, corners, at, units]);
  const layout = useMemo(() => stackLayout(width, height, weights), [width, height]);
  const across = useMemo(
    () =>
      frequencyAxis(
        plantWindow(corners, units.frequency),
        [stackMargins.left, Math.max(stackMargins.left + 1, width - stackMargins.right)],
        units.frequency,
      ),
    [corners, width, units.frequency],
  );
  const [magnitude, phase] = useMemo(
    () => [plantMagnitudePanel(scene, across, layout.plots[0]), plantPhasePanel(scene, across, layout.plots[1])],
    [scene, across, layout],
  );
  const columns = useMemo(() => across.labelled.map(({ x }) => x), [across]);
  const picture = (
    <Layer width={width} height={height}>
      <PanelView picture={magnitude} columns={columns} />
      <PanelView picture={phase} columns={columns} />
      <FrequencyFoot axis={across} y={layout.foot} />
    </Layer>
  );
  return (
    <ChartShell
      name="the plant over frequency"
      description={describePlantCurves(scene, across.domain)}
      height={height}
      onLayout={onLayout}
      picture={width > 0 ? picture : null}
      overlay={width > 0 ? <PlantCursor scene={scene} magnitude={magnitude} phase={phase} across={across} size={layout} /> : null}
      table={() => plantTable(scene, across.domain)}
    />
  );
});
