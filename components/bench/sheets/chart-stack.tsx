import { memo, useEffect, useRef } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { CurveKey } from '@/components/charts';
import { useHeight } from '../layouts/use-height';
import type { StepSizes } from '../live/bench-loop';
import { NAME_OF_A, type Standing } from '../live/use-standing';
import { type ChartSheet, chartSheets } from './chart-sheet';
import { chartsId } from './focus-chart';
import { SheetChart } from './sheet-chart';

interface ChartStackProps {
  active: ChartSheet;
  onActive: (sheet: ChartSheet) => void;
  standing: Standing;
  steps: StepSizes;
}

/** So much of the next sheet shows that one sees there is one. */
const PEEK = 18;
const LEAST_HEIGHT = 240;

/** All chart sheets in one column that snaps to each: swipe up for the next. */
export const ChartStack = memo(function ChartStack({ active, onActive, standing, steps }: ChartStackProps) {
  const scroll = useRef<ScrollView>(null);
  const [viewport, onLayout] = useHeight();
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
        <CurveKey a={NAME_OF_A} b={standing.b?.label} />
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
            <View key={sheet} id={chartsId(sheet)} style={[styles.sheet, { height }]}>
              {viewport > 0 && <SheetChart sheet={sheet} moving={sheet === active} standing={standing} steps={steps} height={height - 4} />}
            </View>
          ))}
          <View style={{ height: PEEK }} />
        </ScrollView>
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  viewport: { flex: 1, minHeight: 0 },
  sheet: { overflow: 'hidden' },
  key: { height: 24, paddingLeft: 44, justifyContent: 'center' },
});
