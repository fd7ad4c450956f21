import { memo } from 'react';
import { formatFrequency, type FrequencyAxis, type LoopPoint, type LoopScene, type PanelPicture, toDecibels, withUnit } from '@/figures';
import type { FrequencyPanel } from './chart-types';
import { StackCursor } from './stack-cursor';
import { loopCells } from './tables';

const ordinates: Record<FrequencyPanel, (point: LoopPoint) => number[]> = {
  magnitude: (point) => [toDecibels(point.magnitude)],
  phase: (point) => [point.phaseDegrees],
  sensitivity: (point) => [point.sensitivity, point.complementarySensitivity],
};

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

/** The cursor of a frequency sheet, with a disc on each curve of A and B. */
export const FrequencyCursor = memo(function FrequencyCursor({ scene, panels, across, size }: FrequencyCursorProps) {
  const { a, b, units } = scene;
  const discs = (design: typeof b, now: number, kind: FrequencyPanel, { axis }: PanelPicture) =>
    design === undefined ? [] : ordinates[kind](design.at(now)).map((value) => ({ x: across.at(now), y: axis.at(value) }));
  return (
    <StackCursor
      plots={panels.map(({ picture }) => picture.plot)}
      across={across}
      size={size}
      unit={units.frequency}
      rest={a.analysis.margins.phase?.frequency}
      valueText={(now) => frequencyCursorText(scene, now)}
      discsAt={(now) =>
        panels.map(({ kind, picture }) => ({
          plot: picture.plot,
          a: discs(a, now, kind, picture),
          b: discs(b, now, kind, picture),
        }))
      }
    />
  );
});
