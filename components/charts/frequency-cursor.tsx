import { StyleSheet } from 'react-native';
import Svg from 'react-native-svg';
import {
  clamp,
  formatFrequency,
  type FrequencyAxis,
  type LoopPoint,
  type LoopScene,
  type PanelPicture,
  toDecibels,
  withUnit,
} from '@/figures';
import { CursorDiscs, CursorFlag, CursorLine } from './cursor-marks';
import { useCursor } from './cursor-provider';
import { PointerLayer } from './pointer-layer';
import { loopCells } from './tables';
import type { FrequencyPanel } from './chart-types';

/** Decades per press of an arrow key, and with Shift. */
const STEP = { fine: 1 / 60, coarse: 1 / 6 };

const ordinates: Record<FrequencyPanel, (point: LoopPoint) => number[]> = {
  magnitude: (point) => [toDecibels(point.magnitude)],
  phase: (point) => [point.phaseDegrees],
  sensitivity: (point) => [point.sensitivity, point.complementarySensitivity],
};

/** The next frequency for an arrow key, kept within a window (rad/s). */
export function steppedFrequency(now: number, direction: 1 | -1, coarse: boolean, [low, high]: readonly [number, number]): number {
  return clamp(now * 10 ** (direction * (coarse ? STEP.coarse : STEP.fine)), low, high);
}

/** What a screen reader says of the cursor. */
export function frequencyCursorText({ a, units }: LoopScene, frequency: number): string {
  const [magnitude, phase, s, t] = loopCells(a, frequency, units.magnitude);
  return `${withUnit(formatFrequency(frequency, units.frequency), units.frequency)}, |L| ${magnitude} ${units.magnitude}, arg L ${phase}°, |S| ${s}, |T| ${t}`;
}

export interface FrequencyCursorProps {
  scene: LoopScene;
  panels: readonly { kind: FrequencyPanel; picture: PanelPicture }[];
  across: FrequencyAxis;
  size: { width: number; height: number; foot: number };
}

/** The cursor of a frequency sheet: all that is drawn again when it moves. */
export function FrequencyCursor({ scene, panels, across, size }: FrequencyCursorProps) {
  const [frequency, set] = useCursor('frequency');
  const { a, b, units } = scene;
  const [low, high] = across.domain;
  const seen = frequency !== null && frequency >= low && frequency <= high;
  const now = clamp(frequency ?? a.analysis.margins.phase?.frequency ?? Math.sqrt(low * high), low, high);
  const x = across.at(now);
  const discs = (design: typeof b, kind: FrequencyPanel, { axis }: PanelPicture) =>
    design === undefined ? [] : ordinates[kind](design.at(now)).map((value) => ({ x, y: axis.at(value) }));
  const plots = panels.map(({ picture }) => picture.plot);
  const [top, bottom] = [plots[0], plots[plots.length - 1]];
  return (
    <>
      {seen ? (
        <Svg width={size.width} height={size.height} style={StyleSheet.absoluteFill} aria-hidden>
          <CursorLine x={x} plots={plots} />
          {panels.map(({ kind, picture }) => (
            <CursorDiscs key={kind} a={discs(a, kind, picture)} b={discs(b, kind, picture)} plot={picture.plot} />
          ))}
          <CursorFlag x={x} y={size.foot} text={formatFrequency(now, units.frequency)} pixels={[top.x, top.x + top.width]} />
        </Svg>
      ) : null}
      <PointerLayer
        rect={{ x: top.x, y: top.y, width: top.width, height: bottom.y + bottom.height - top.y }}
        label="Cursor, frequency"
        valueText={frequencyCursorText(scene, now)}
        range={{ least: low, most: high, now }}
        onPoint={(point) => set(clamp(across.invert(point.x), low, high))}
        onStep={(direction, coarse) => set(steppedFrequency(now, direction, coarse, across.domain))}
      />
    </>
  );
}
