import { memo } from 'react';
import {
  clamp,
  formatSeconds,
  interpolateAt,
  type LoopScene,
  type PanelPicture,
  type TimeAxis,
  type TimePanel,
  timeSeriesOf,
  withUnit,
} from '@/figures';
import { CursorDiscs, CursorFlag, CursorLine } from './cursor-marks';
import { useCursor } from './cursor-provider';
import { Layer } from './layer';
import { PointerLayer } from './pointer-layer';
import { responseCell } from './tables';

/** Parts of the axis per press of an arrow key, and with Shift. */
const STEPS = { fine: 1 / 120, coarse: 1 / 12 };

export interface TimeCursorProps {
  scene: LoopScene;
  panels: readonly { panel: TimePanel; picture: PanelPicture }[];
  across: TimeAxis;
  size: { width: number; height: number; foot: number };
}

/** The cursor of a time sheet, a time of its own: all that is drawn again when it moves. */
export const TimeCursor = memo(function TimeCursor({ scene: { a, b }, panels, across, size }: TimeCursorProps) {
  const [time, set] = useCursor('time');
  const [start, end] = across.domain;
  const seen = time !== null && time >= start && time <= end;
  const now = clamp(time ?? 0, start, end);
  const x = across.at(now);
  const discs = (design: typeof b, { kind }: TimePanel, { axis }: PanelPicture) => {
    const series = design === undefined ? null : timeSeriesOf(design, kind);
    const value = series === null ? null : interpolateAt(series.time, series.values, now);
    return value === null ? [] : [{ x, y: axis.at(value) }];
  };
  const plots = panels.map(({ picture }) => picture.plot);
  const [top, bottom] = [plots[0], plots[plots.length - 1]];
  const text = [
    `${formatSeconds(now)} s`,
    ...panels.map(({ panel }) => `${panel.title} ${withUnit(responseCell(a, panel.kind, now), panel.unit)}`),
  ];
  return (
    <>
      {seen ? (
        <Layer width={size.width} height={size.height}>
          <CursorLine x={x} plots={plots} />
          {panels.map(({ panel, picture }) => (
            <CursorDiscs key={panel.kind} a={discs(a, panel, picture)} b={discs(b, panel, picture)} plot={picture.plot} />
          ))}
          <CursorFlag x={x} y={size.foot} text={formatSeconds(now)} pixels={[top.x, top.x + top.width]} />
        </Layer>
      ) : null}
      <PointerLayer
        rect={{ x: top.x, y: top.y, width: top.width, height: bottom.y + bottom.height - top.y }}
        label="Cursor, time"
        valueText={text.join(', ')}
        range={{ least: start, most: end, now }}
        onPoint={(point) => set(clamp(across.invert(point.x), start, end))}
        onStep={(direction, coarse) => set(clamp(now + direction * (coarse ? STEPS.coarse : STEPS.fine) * (end - start), start, end))}
      />
    </>
  );
});
