import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { gains } from '../draft/gain';
import { GainCell } from '../gains/gain-cell';
import { HistoryButtons } from '../keep/history-buttons';
import { KeepControl } from '../keep/keep-control';
import { SavedState } from '../keep/saved-state';
import { useKeepButton } from '../keep/use-keep-button';
import { useGainMarks } from '../over/use-gain-marks';
import type { BenchActions } from './bench-actions';

/** All gains along the foot, and at the end whether they are kept. Where there is less room the state stands below, and under 860 the gains two by two. */
export const GainShelf = memo(function GainShelf({
  paired = false,
  onActiveGain,
  onSettings,
  outcome,
  onKeep,
}: BenchActions & { paired?: boolean }) {
  const { colors } = useTheme();
  const marks = useGainMarks(gains);
  const { remark } = useKeepButton();
  const edge = { borderColor: colors.rule };
  return (
    <View
      role="region"
      aria-label="Gains"
      style={[styles.shelf, paired && styles.stacked, { backgroundColor: colors.paper, borderTopColor: colors.ink }]}
    >
      <View style={[styles.gains, paired && styles.pairs]}>
        {gains.map((gain) => (
          <View key={gain} style={[styles.gain, paired && styles.quarter, edge]}>
            <GainCell gain={gain} marks={marks[gain]} onActive={onActiveGain} />
          </View>
        ))}
      </View>
      <View style={[paired ? styles.savedRow : styles.saved, { backgroundColor: colors.bar }]}>
        <View style={styles.state}>
          <SavedState />
          {remark && (
            <Text step="tick" tone="ink2" numberOfLines={3}>
              {remark}
            </Text>
          )}
        </View>
        <View style={styles.actions}>
          <HistoryButtons />
          <Button kind="quiet" label="All settings" onPress={onSettings} />
        </View>
        <KeepControl outcome={outcome} onKeep={onKeep} />
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  shelf: { flexDirection: 'row', borderTopWidth: line.head },
  stacked: { flexDirection: 'column' },
  gains: { flex: 1, flexDirection: 'row', minWidth: 0 },
  pairs: { flexWrap: 'wrap', flexGrow: 0, flexBasis: 'auto' },
  gain: { flex: 1, minWidth: 0, borderRightWidth: line.hair },
  quarter: { flexBasis: '25%', minWidth: 215, borderBottomWidth: line.hair },
  saved: { width: 246, paddingVertical: 8, paddingHorizontal: 18, gap: 6, justifyContent: 'space-between' },
  savedRow: { flexDirection: 'row', alignItems: 'center', gap: 16, paddingVertical: 8, paddingHorizontal: 18 },
  state: { flexShrink: 1, flexGrow: 1 },
  actions: { flexDirection: 'row', alignItems: 'center', gap: 6 },
});
