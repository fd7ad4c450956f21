import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { useOpenPages } from '@/components/navigation/project-context';
import { IconButton } from '@/components/ui/icon-button';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter, line } from '@/components/ui/tokens';
import type { Gain } from '../draft/gain';
import { ActiveGain } from '../gains/active-gain';
import { GainTiles } from '../gains/gain-tiles';
import { HistoryButtons } from '../keep/history-buttons';
import { KeepControl } from '../keep/keep-control';
import { SavedState } from '../keep/saved-state';
import { useKeepButton } from '../keep/use-keep-button';
import { useGainMarks } from '../over/use-gain-marks';
import type { BenchActions } from './bench-actions';

const only: Readonly<Record<Gain, readonly Gain[]>> = {
  kp: ['kp'],
  integral: ['integral'],
  derivative: ['derivative'],
  filterTime: ['filterTime'],
};

/** The gains in reach of a thumb: one is active, its rule is dragged, its nudges pressed, its number entered. */
export const Dock = memo(function Dock({ activeGain, onActiveGain, onSettings, outcome, onKeep }: BenchActions) {
  const { colors } = useTheme();
  const openPages = useOpenPages();
  const marks = useGainMarks(only[activeGain]);
  const { remark } = useKeepButton();
  return (
    <View role="region" aria-label="Gains" style={[styles.dock, { backgroundColor: colors.paper, borderTopColor: colors.ink }]}>
      <GainTiles active={activeGain} onChoose={onActiveGain} onSettings={onSettings} />
      <View style={styles.inset}>
        <ActiveGain gain={activeGain} marks={marks[activeGain]} />
        <View style={styles.actions}>
          <IconButton icon="pages" label="All pages" onPress={openPages} />
          <HistoryButtons />
          <View style={styles.saved}>
            <SavedState compact />
          </View>
          <KeepControl outcome={outcome} onKeep={onKeep} compact />
        </View>
        {remark && (
          <Text step="tick" tone="ink2">
            {remark}
          </Text>
        )}
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  dock: { borderTopWidth: line.head, paddingBottom: 8 },
  inset: { paddingHorizontal: gutter.phone, gap: 6 },
  actions: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  saved: { flex: 1, paddingLeft: 4 },
});
