import type { PointerEvent, ViewStyle } from 'react-native';
import { View } from 'react-native';
import type { Point, Rect } from '@/figures';
import { useFocusRing } from './use-focus-ring';

export interface PointerLayerProps {
  /** Where on the chart the layer lies; points are given in the chart's pixels. */
  rect: Rect;
  label: string;
  valueText: string;
  range: { least: number; most: number; now: number };
  onPoint: (point: Point) => void;
  /** An arrow key: one step up or down, a coarse one with Shift. */
  onStep: (direction: 1 | -1, coarse: boolean) => void;
}

const directions: Record<string, 1 | -1> = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 };

// Sideways drags are the cursor's; the page keeps the upright ones.
const sideways = { touchAction: 'pan-y', cursor: 'crosshair' } as unknown as ViewStyle;

/** The transparent layer that takes mouse, touch and keys for a chart's cursor, and says its value as a slider does. */
export function PointerLayer({ rect, label, valueText, range, onPoint, onStep }: PointerLayerProps) {
  const { style, ...focus } = useFocusRing();
  const follow = ({ nativeEvent }: PointerEvent) => onPoint({ x: rect.x + nativeEvent.offsetX, y: rect.y + nativeEvent.offsetY });
  const step = (event: KeyboardEvent) => {
    const direction = directions[event.key];
    if (direction === undefined) return;
    event.preventDefault();
    onStep(direction, event.shiftKey);
  };
  return (
    <View
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={range.least}
      aria-valuemax={range.most}
      aria-valuenow={range.now}
      aria-valuetext={valueText}
      onPointerDown={follow}
      onPointerMove={follow}
      onKeyDown={step}
      style={[{ position: 'absolute', left: rect.x, top: rect.y, width: rect.width, height: rect.height }, sideways, style]}
      {...focus}
    />
  );
}
