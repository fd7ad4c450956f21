import { memo, useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line, touch } from '@/components/ui/tokens';
import { type ChartSheet, chartSheets, sheetWords } from './chart-sheet';

interface SheetTabsProps {
  active: ChartSheet;
  onChoose: (sheet: ChartSheet) => void;
}

const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowLeft: -1 };

/** The names of the chart sheets. Tap one, or walk them with the arrows. */
export const SheetTabs = memo(function SheetTabs({ active, onChoose }: SheetTabsProps) {
  const { colors } = useTheme();
  const row = useRef<View>(null);
  const walk = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const next = (chartSheets.indexOf(active) + step + chartSheets.length) % chartSheets.length;
    onChoose(chartSheets[next]);
    (row.current as unknown as HTMLElement).querySelectorAll<HTMLElement>('[role=tab]')[next].focus();
  };
  return (
    <View ref={row} role="tablist" aria-label="Charts" style={[styles.row, { borderBottomColor: colors.rule2 }]} onKeyDown={walk}>
      {chartSheets.map((sheet) => {
        const chosen = sheet === active;
        return (
          <Pressable
            key={sheet}
            role="tab"
            aria-selected={chosen}
            tabIndex={chosen ? 0 : -1}
            onPress={() => onChoose(sheet)}
            style={styles.tab}
          >
            <Text step="note" weight={chosen ? 700 : 500} tone={chosen ? 'ink' : 'ink2'} numberOfLines={1}>
              {sheetWords[sheet].name}
            </Text>
            {chosen && <View style={[styles.mark, { backgroundColor: colors.ink }]} />}
          </Pressable>
        );
      })}
    </View>
  );
});

const styles = StyleSheet.create({
  row: { flexDirection: 'row', paddingHorizontal: 4, borderBottomWidth: line.hair },
  tab: { flexGrow: 1, minWidth: touch, height: touch, paddingHorizontal: 7, alignItems: 'center', justifyContent: 'center' },
  mark: { position: 'absolute', left: 0, right: 0, bottom: 0, height: 4 },
});
