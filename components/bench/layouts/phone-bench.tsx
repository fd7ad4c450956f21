import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { timePanels } from '@/components/charts/time-panels';
import { useTheme } from '@/components/ui/theme';
import { useBench, useHasAnswer } from '../bench-context';
import { Notices } from '../keep/notices';
import { useLookingAt } from '../live/use-looking-at';
import { ChartStack } from '../sheets/chart-stack';
import { ShownReadOut, ShownTimeReadOut } from '../sheets/shown-read-out';
import { SheetTabs } from '../sheets/sheet-tabs';
import { BenchStrip } from '../strip/bench-strip';
import type { BenchLayoutProps } from './bench-actions';
import { Dock } from './dock';

/** One column: numbers fixed on top, one chart sheet at a time, the gains at the foot. */
export function PhoneBench({ link, standing, onChart, onCase: _, onFollow, ...actions }: BenchLayoutProps) {
  const { outcome } = actions;
  const { colors } = useTheme();
  const { plant } = useBench().subject;
  const hasAnswer = useHasAnswer();
  const panels = useMemo(() => timePanels(plant.units, link.steps), [plant.units, link.steps]);
  const overTime = link.chart === 'step' || link.chart === 'load';
  useLookingAt(overTime ? 'responses' : 'frequency');
  const shown = link.chart === 'load' ? [panels.load] : [panels.reference, panels.control];
  return (
    <View style={[styles.column, { backgroundColor: colors.paper }]}>
      <BenchStrip />
      <Notices outcome={outcome} onFollow={onFollow} />
      <SheetTabs active={link.chart} onChoose={onChart} />
      {overTime ? <ShownTimeReadOut standing={standing} panels={shown} /> : <ShownReadOut standing={standing} layout="line" />}
      {hasAnswer ? (
        <ChartStack active={link.chart} onActive={onChart} standing={standing} steps={link.steps} />
      ) : (
        <View style={styles.column} />
      )}
      <Dock {...actions} />
    </View>
  );
}

const styles = StyleSheet.create({ column: { flex: 1, minHeight: 0 } });
