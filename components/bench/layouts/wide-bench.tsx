import { useMemo } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { timePanels } from '@/components/charts/time-panels';
import { useTheme } from '@/components/ui/theme';
import { useBench, useHasAnswer } from '../bench-context';
import { Notices } from '../keep/notices';
import { useLookingAt } from '../live/use-looking-at';
import { chartsId } from '../sheets/focus-chart';
import { ShownFrequency, ShownPlane, ShownTime } from '../sheets/shown-charts';
import { ShownReadOut } from '../sheets/shown-read-out';
import { BenchStrip } from '../strip/bench-strip';
import { CaseLine } from '../strip/case-line';
import type { BenchLayoutProps } from './bench-actions';
import { GainShelf } from './gain-shelf';
import { useHeight } from './use-height';

const READ_OUT_HEIGHT = 96;
const LEAST_CHARTS = 400;
const LEAST_PLANE = 300;
const PADDING = 20;

/** Where the charts stand: side by side in three columns, or time below frequency with the plane beside. */
function roomFor(paired: boolean, height: number) {
  const room = Math.max(LEAST_CHARTS, height - PADDING);
  const stacked = Math.max(620, room);
  return paired
    ? { frequency: Math.round(stacked * 0.58), plane: Math.min(520, stacked - READ_OUT_HEIGHT), time: Math.round(stacked * 0.42) - 8 }
    : { frequency: room, plane: Math.max(LEAST_PLANE, room - READ_OUT_HEIGHT), time: room };
}

/** Everything at once: numbers on top, the charts side by side, all gains along the foot. Two columns where `paired`. */
export function WideBench({
  paired = false,
  link,
  standing,
  onChart: _,
  onCase,
  onFollow,
  ...actions
}: BenchLayoutProps & { paired?: boolean }) {
  const { outcome } = actions;
  const { colors } = useTheme();
  const plantUnits = useBench().subject.plant.units;
  const [height, onLayout] = useHeight();
  const room = roomFor(paired, height);
  const panels = useMemo(() => {
    const { reference, load, control } = timePanels(plantUnits, link.steps);
    return [reference, load, control];
  }, [plantUnits, link.steps]);
  const hasAnswer = useHasAnswer();
  useLookingAt('all');
  const column = { backgroundColor: colors.paper };
  const time = (
    <View id={chartsId('time')}>
      <ShownTime standing={standing} panels={panels} end={standing.ends?.both} height={room.time} />
    </View>
  );
  return (
    <View style={styles.page}>
      <BenchStrip />
      <Notices outcome={outcome} onFollow={onFollow} />
      <CaseLine onCase={onCase} />
      <View style={styles.middle} onLayout={onLayout}>
        <ScrollView contentContainerStyle={[styles.columns, { backgroundColor: colors.rule }]}>
          {hasAnswer && height > 0 && (
            <>
              <View style={[styles.column, paired ? styles.share : styles.frequency, column]}>
                <View id={chartsId('frequency')}>
                  <ShownFrequency standing={standing} height={room.frequency} />
                </View>
                {paired && time}
              </View>
              <View style={[styles.column, styles.share, column]}>
                <View id={chartsId('plane')}>
                  <ShownPlane standing={standing} height={room.plane} />
                </View>
                <ShownReadOut standing={standing} layout="table" />
              </View>
              {!paired && <View style={[styles.column, styles.time, column]}>{time}</View>}
            </>
          )}
        </ScrollView>
      </View>
      <GainShelf {...actions} paired={paired} />
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0 },
  middle: { flex: 1, minHeight: 260 },
  columns: { flexGrow: 1, flexDirection: 'row', gap: 1 },
  column: { paddingTop: 10, paddingBottom: 8, paddingLeft: 16, paddingRight: 12, minWidth: 0 },
  frequency: { flexGrow: 0, flexShrink: 1, flexBasis: 508 },
  time: { flexGrow: 0, flexShrink: 1, flexBasis: 432 },
  share: { flexGrow: 1, flexShrink: 1, flexBasis: 400 },
});
