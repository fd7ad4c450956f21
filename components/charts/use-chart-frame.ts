import { useCallback, useState } from 'react';
import type { LayoutChangeEvent } from 'react-native';

export interface ChartFrame {
  /** 0 until the first layout: a chart draws nothing before. */
  width: number;
  onLayout: (event: LayoutChangeEvent) => void;
}

/** The width that a chart is given by its place. `fixed` is for pictures whose width is known. */
export function useChartFrame(fixed?: number): ChartFrame {
  const [measured, setMeasured] = useState(0);
  const onLayout = useCallback((event: LayoutChangeEvent) => setMeasured(Math.round(event.nativeEvent.layout.width)), []);
  return { width: fixed ?? measured, onLayout };
}
