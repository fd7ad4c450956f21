import { StyleSheet, View } from 'react-native';
import { ReadOut, TimeReadOut } from '@/components/charts';
import { useTheme } from '@/components/ui/theme';
import { useUnits } from '@/components/ui/units';
import { useBench } from '../bench-context';
import { Notices } from '../keep/notices';
import { useLookingAt } from '../live/use-looking-at';
import { ChartStack } from '../sheets/chart-stack';
import { SheetTabs } from '../sheets/sheet-tabs';
import { timePanels } from '../sheets/time-panels';
import { BenchStrip } from '../strip/bench-strip';
import type { BenchLayoutProps } from './bench-actions';
import { Dock } from './dock';

/** One column: numbers fixed on top, one chart sheet at a time, the gains at the foot. */
export function PhoneBench({ link, designs, onChart, onCase: _, onFollow, ...actions }: BenchLayoutProps) {
  const { outcome } = actions;
  const { colors } = useTheme();
  const units = useUnits();
  const { plant } = useBench().subject;
  const { a, timed, b } = designs;
  const panels = timePanels(plant.units, link.steps);
  const overTime = link.chart === 'step' || link.chart === 'load';
  useLookingAt(overTime ? 'responses' : 'frequency');
  const shown = link.chart === 'load' ? [panels.load] : [panels.reference, panels.control];
  return (
    <View style={[styles.column, { backgroundColor: colors.paper }]}>
      <BenchStrip />
      <Notices outcome={outcome} onFollow={onFollow} />
      <SheetTabs active={link.chart} onChoose={onChart} />
      {overTime
        ? timed && <TimeReadOut a={timed} b={b} layout="line" panels={shown} />
        : a && <ReadOut a={a} b={b} units={units} layout="line" />}
      {a ? <ChartStack active={link.chart} onActive={onChart} designs={designs} steps={link.steps} /> : <View style={styles.column} />}
      <Dock {...actions} />
    </View>
  );
}

const styles = StyleSheet.create({ column: { flex: 1, minHeight: 0 } });
