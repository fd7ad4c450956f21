import { useEffect, useRef } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { type ChartDesign, CurveKey } from '@/components/charts';
import { useHeight } from '../layouts/use-height';
import type { StepSizes } from '../live/bench-loop';
import type { Designs } from '../live/use-designs';
import { type ChartSheet, chartSheets } from './chart-sheet';
import { chartsId } from './focus-chart';
import { SheetChart } from './sheet-chart';

interface ChartStackProps {
  active: ChartSheet;
  onActive: (sheet: ChartSheet) => void;
  designs: Designs;
  steps: StepSizes;
}

/** So much of the next sheet shows that one sees there is one. */
const PEEK = 18;
const LEAST_HEIGHT = 240;

/** What a sheet draws: A as it moves on the sheet that is looked at, A as it last rested on the others. */
function drawnOn(sheet: ChartSheet, active: ChartSheet, { a, timed, rested }: Designs): ChartDesign | null {
  if (sheet !== active) return rested;
  return sheet === 'step' || sheet === 'load' ? timed : a;
}

/** All chart sheets in one column that snaps to each: swipe up for the next. */
export function ChartStack({ active, onActive, designs, steps }: ChartStackProps) {
  const { a, b, ends } = designs;
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
      <View style={styles.key}>{a && <CurveKey a={a.label} b={b?.label} />}</View>
      <View style={styles.viewport} onLayout={onLayout}>
        <ScrollView
          ref={scroll}
          pagingEnabled
          showsVerticalScrollIndicator={false}
          scrollEventThrottle={50}
          onScroll={({ nativeEvent }) => follow(nativeEvent.contentOffset.y)}
        >
          {chartSheets.map((sheet) => {
            const drawn = drawnOn(sheet, active, designs);
            const shown = { b, steps, height: height - 4, ends: ends ?? undefined };
            return (
              <View key={sheet} id={chartsId(sheet)} style={[styles.sheet, { height }]}>
                {viewport > 0 && drawn && <SheetChart sheet={sheet} a={drawn} {...shown} />}
              </View>
            );
          })}
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
