import { useCallback, useState } from 'react';
import type { LayoutChangeEvent } from 'react-native';

/** The height that a region was given, for what is drawn to fill it; 0 before the first layout. */
export function useHeight(): [number, (event: LayoutChangeEvent) => void] {
  const [height, setHeight] = useState(0);
  const onLayout = useCallback(({ nativeEvent }: LayoutChangeEvent) => setHeight(Math.round(nativeEvent.layout.height)), []);
  return [height, onLayout];
}
