import { useEffect, useRef, useState } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { type ChartDesign, CurveKey } from '@/components/charts';
import { useAnswer } from '../bench-context';
import { useHeight } from '../layouts/use-height';
import type { StepSizes } from '../live/bench-loop';
import { type ChartSheet, chartSheets } from './chart-sheet';
import { SheetChart } from './sheet-chart';

interface ChartStackProps {
  active: ChartSheet;
  onActive: (sheet: ChartSheet) => void;
  a: ChartDesign;
  b: ChartDesign | undefined;
  steps: StepSizes;
}

/** So much of the next sheet shows that one sees there is one. */
const PEEK = 18;
const LEAST_HEIGHT = 240;

/** A as it stood when it last rested: sheets that nobody looks at are not drawn again while a gain moves. */
function useRested(a: ChartDesign): ChartDesign {
  const { detail } = useAnswer();
  const [rested, setRested] = useState(a);
  if (detail === 'full' && rested !== a) setRested(a);
  return rested;
}

/** All chart sheets in one column that snaps to each: swipe up for the next. */
export function ChartStack({ active, onActive, a, b, steps }: ChartStackProps) {
  const scroll = useRef<ScrollView>(null);
  const [viewport, onLayout] = useHeight();
  const rested = useRested(a);
  const height = Math.max(LEAST_HEIGHT, viewport - PEEK);
  const shown = useRef<ChartSheet>('bode');
  useEffect(() => {
    if (viewport === 0 || shown.current === active) return;
    shown.current = active;
    scroll.current?.scrollTo({ y: chartSheets.indexOf(active) * height, animated: false });
  }, [active, height, viewport]);
  const follow = (y: number) => {
    const sheet = chartSheets[Math.min(chartSheets.length - 1, Math.round(y / height))];
    if (sheet === shown.current) return;
    shown.current = sheet;
    onActive(sheet);
  };
  return (
    <View style={styles.viewport}>
      <View style={styles.key}>
        <CurveKey a={a.label} b={b?.label} />
      </View>
      <View style={styles.viewport} onLayout={onLayout}>
        <ScrollView
          ref={scroll}
          pagingEnabled
          showsVerticalScrollIndicator={false}
          scrollEventThrottle={50}
          onScroll={({ nativeEvent }) => follow(nativeEvent.contentOffset.y)}
        >
          {chartSheets.map((sheet) => (
            <View key={sheet} style={[styles.sheet, { height }]}>
              {viewport > 0 && <SheetChart sheet={sheet} a={sheet === active ? a : rested} b={b} steps={steps} height={height - 4} />}
            </View>
          ))}
          <View style={{ height: PEEK }} />
        </ScrollView>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  viewport: { flex: 1, minHeight: 0 },
  sheet: { overflow: 'hidden' },
  key: { height: 24, paddingLeft: 44, justifyContent: 'center' },
});
