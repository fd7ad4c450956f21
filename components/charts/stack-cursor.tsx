import { clamp, formatFrequency, type FrequencyAxis, type FrequencyUnit, type Point, type Rect } from '@/figures';
import { CursorDiscs, CursorFlag, CursorLine } from './cursor-marks';
import { useCursor } from './cursor-provider';
import { Layer } from './layer';
import { PointerLayer } from './pointer-layer';

/** Decades per press of an arrow key, and with Shift. */
const STEP = { fine: 1 / 60, coarse: 1 / 6 };

/** The next frequency for an arrow key, kept within a window (rad/s). */
export function steppedFrequency(now: number, direction: 1 | -1, coarse: boolean, [low, high]: readonly [number, number]): number {
  return clamp(now * 10 ** (direction * (coarse ? STEP.coarse : STEP.fine)), low, high);
}

/** Where the cursor's discs stand in one panel. */
export interface PanelDiscs {
  plot: Rect;
  a: readonly Point[];
  b: readonly Point[];
}

export interface StackCursorProps {
  plots: readonly Rect[];
  across: FrequencyAxis;
  size: { width: number; height: number; foot: number };
  unit: FrequencyUnit;
  /** Where an arrow key starts from while no cursor stands; rad/s. */
  rest: number | undefined;
  /** What a screen reader says of the cursor at a frequency. */
  valueText: (frequency: number) => string;
  discsAt: (frequency: number) => readonly PanelDiscs[];
}

/** The frequency cursor through a stack of panels: all that is drawn again when it moves. */
export function StackCursor({ plots, across, size, unit, rest, valueText, discsAt }: StackCursorProps) {
  const [frequency, set] = useCursor('frequency');
  const [low, high] = across.domain;
  const seen = frequency !== null && frequency >= low && frequency <= high;
  const now = clamp(frequency ?? rest ?? Math.sqrt(low * high), low, high);
  const x = across.at(now);
  const [top, bottom] = [plots[0], plots[plots.length - 1]];
  return (
    <>
      {seen ? (
        <Layer width={size.width} height={size.height}>
          <CursorLine x={x} plots={plots} />
          {discsAt(now).map(({ plot, a, b }) => (
            <CursorDiscs key={plot.y} a={a} b={b} plot={plot} />
          ))}
          <CursorFlag x={x} y={size.foot} text={formatFrequency(now, unit)} pixels={[top.x, top.x + top.width]} />
        </Layer>
      ) : null}
      <PointerLayer
        rect={{ x: top.x, y: top.y, width: top.width, height: bottom.y + bottom.height - top.y }}
        label="Cursor, frequency"
        valueText={valueText(now)}
        range={{ least: low, most: high, now }}
        onPoint={(point) => set(clamp(across.invert(point.x), low, high))}
        onStep={(direction, coarse) => set(steppedFrequency(now, direction, coarse, across.domain))}
      />
    </>
  );
}
