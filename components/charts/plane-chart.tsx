import { memo, useDeferredValue, useMemo, useState } from 'react';
import { Segments } from '@/components/ui/segments';
import { touch } from '@/components/ui/tokens';
import {
  frequencyWindow,
  type LoopScene,
  nicholsPicture,
  nicholsWindow,
  nyquistPicture,
  nyquistWindow,
  type PlanePicture,
  type Rect,
  responseOf,
  textWidth,
} from '@/figures';
import { ChartShell } from './chart-shell';
import { ChartText } from './chart-text';
import type { LoopChartProps, PlaneKind } from './chart-types';
import { describePlane, encirclementText } from './describe';
import { Layer } from './layer';
import { PlaneCursor } from './plane-cursor';
import { PlaneView } from './plane-view';
import { frequencyTable } from './tables';
import { UnstableMark } from './unstable-mark';
import { useChartFrame } from './use-chart-frame';

export interface PlaneChartProps extends LoopChartProps {
  height: number;
  /** Measured where absent. */
  width?: number;
  /** Which plane is drawn, where the screen keeps that; the chart's own switch where absent. */
  plane?: PlaneKind;
  onPlane?: (plane: PlaneKind) => void;
}

const names: Record<PlaneKind, string> = { nyquist: 'Nyquist', nichols: 'Nichols' };
const options = (['nyquist', 'nichols'] as const).map((value) => ({ value, label: names[value] }));
const FOOT = 24;
/** Width of the switch and the table's button at the right end of the title's line. */
const TOOLS = 206;
const TITLE_PITCH = 52;
const CONTOUR_WORDS = 'contours are |S|';
const insets: Record<PlaneKind, { left: number; right: number; foot: number }> = {
  nyquist: { left: 6, right: 6, foot: FOOT },
  nichols: { left: 40, right: 6, foot: FOOT + 22 },
};

function plotOf(kind: PlaneKind, width: number, height: number): Rect {
  const { left, right, foot } = insets[kind];
  return { x: left, y: touch + 4, width: Math.max(1, width - left - right), height: Math.max(1, height - touch - 4 - foot) };
}

function pictureOf(kind: PlaneKind, scene: LoopScene, plot: Rect): PlanePicture {
  const designs = scene.b === undefined ? [scene.a] : [scene.a, scene.b];
  if (kind === 'nyquist') return nyquistPicture(scene, nyquistWindow(designs.map(({ analysis }) => analysis)), plot);
  return nicholsPicture(scene, nicholsWindow(designs.map(responseOf)), plot);
}

/** The name and what the contours are; where the chart is narrow the words give way to the switch, the longer ones first. */
function PlaneTitle({ name, x, free }: { name: string; x: number; free: number }) {
  const after = x + TITLE_PITCH;
  return (
    <>
      {x + textWidth(name) <= free && (
        <ChartText x={x} y={26} tone="title">
          {name}
        </ChartText>
      )}
      {after + textWidth(CONTOUR_WORDS) <= free && (
        <ChartText x={after} y={26} tone="contour">
          {CONTOUR_WORDS}
        </ChartText>
      )}
    </>
  );
}

/** L on the contours of |S|, as Nyquist or Nichols: how near it comes to −1, in which direction it runs, and how often it goes round. */
export const PlaneChart = memo(function PlaneChart({ a, b, others, limits, units, height, width: fixed, plane, onPlane }: PlaneChartProps) {
  const { width, onLayout } = useChartFrame(fixed);
  const [own, setOwn] = useState<PlaneKind>('nyquist');
  const kind = plane ?? own;
  const scene = useMemo(() => ({ a, b, others, limits, units }), [a, b, others, limits, units]);
  const picture = useMemo(() => pictureOf(kind, scene, plotOf(kind, width, height)), [kind, scene, width, height]);
  // What is read of the chart follows its curves when there is time.
  const read = useDeferredValue(useMemo(() => ({ scene, picture }), [scene, picture]));
  const count = encirclementText(scene);
  const { plot } = picture;
  const right = plot.x + plot.width;
  const foot = kind === 'nyquist' ? `posts along L: ${units.frequency}` : `dB over arg L, posts in ${units.frequency}`;
  const choose = onPlane ?? setOwn;
  const tools = useMemo(() => <Segments label="Plane" value={kind} options={options} onChange={choose} />, [kind, choose]);
  const drawing = (
    <Layer width={width} height={height}>
      <PlaneView picture={picture} />
      <PlaneTitle name={names[kind]} x={plot.x} free={width - TOOLS} />
      <ChartText x={plot.x} y={height - 6}>
        {foot}
      </ChartText>
      <ChartText x={right} y={height - 6} anchor="end" tone={count.differ ? 'fail' : 'quiet'}>
        {count.text}
      </ChartText>
      {a.analysis.closedLoop.stable ? null : <UnstableMark x={right} y={plot.y + 14} />}
    </Layer>
  );
  return (
    <ChartShell
      name={names[kind]}
      description={describePlane(read.scene, names[kind])}
      height={height}
      onLayout={onLayout}
      picture={width > 0 ? drawing : null}
      overlay={width > 0 ? <PlaneCursor {...read} width={width} height={height} /> : null}
      table={() => frequencyTable(scene, frequencyWindow([a.analysis], units.frequency))}
      tools={tools}
    />
  );
});
