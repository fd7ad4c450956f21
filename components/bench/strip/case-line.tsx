import { memo } from 'react';
import { StyleSheet, View } from 'react-native';
import { Menu } from '@/components/ui/menu';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter, line } from '@/components/ui/tokens';
import { useBench } from '../bench-context';
import { BudgetLine } from './budget-line';

interface CaseLineProps {
  onCase: (caseId: string) => void;
}

/** Which case the curves show, and its delay budget. */
export const CaseLine = memo(function CaseLine({ onCase }: CaseLineProps) {
  const { colors } = useTheme();
  const {
    shownCase,
    plant,
    conditions: { cases },
  } = useBench().subject;
  const label = `Curves show ${shownCase.name}`;
  const items = cases.map(({ id, name }) => ({ key: id, label: name, current: id === shownCase.id, onSelect: () => onCase(id) }));
  return (
    <View style={[styles.line, { backgroundColor: colors.paper, borderBottomColor: colors.rule }]}>
      {cases.length > 1 ? (
        <Menu label={label} kind="quiet" items={items} />
      ) : (
        <Text step="note" weight={600} numberOfLines={1}>
          {label}.
        </Text>
      )}
      <Text step="note" tone="ink2" numberOfLines={1} style={styles.plant}>
        <Text step="note" weight={600}>
          Plant
        </Text>{' '}
        {plant.name}, rev {plant.revision}.
      </Text>
      <BudgetLine />
    </View>
  );
});

const styles = StyleSheet.create({
  plant: { flexShrink: 1 },
  line: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 20,
    minHeight: 46,
    paddingHorizontal: gutter.wide,
    borderBottomWidth: line.hair,
    zIndex: 15,
  },
});
