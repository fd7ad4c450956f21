import { memo } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { VerdictGlyph } from '@/components/ui/verdict-glyph';
import { VerdictWord } from '@/components/ui/verdict-word';
import type { Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import { verdictWords } from '@/figures/verdict-shape';
import { BasisMark } from '../basis-mark';
import { basisWords } from '../basis-words';
import type { CaseNumber } from '../model/case-number';
import type { ListRow } from './list-sort';

export interface ListPlace {
  worst: string | undefined;
  selected: string | undefined;
  onOpen: (caseId: string) => void;
}

interface CaseRowProps extends ListPlace {
  row: ListRow;
  columns: readonly Quantity[];
}

/** "Ms 1.63, tight" */
export const spokenNumber = (quantity: Quantity, { text, verdict }: CaseNumber): string =>
  [`${quantityName(quantity)} ${text}`, verdict && verdictWords[verdict]].filter(Boolean).join(', ');

/** One case of the phone's list: its name and verdict, and every check under them. */
export const CaseRow = memo(function CaseRow({ row: { view, verdict, numbers }, columns, worst, selected, onOpen }: CaseRowProps) {
  const { colors } = useTheme();
  const { id, name, basis } = view.kept;
  const isWorst = id === worst;
  const label = [
    name,
    isWorst ? 'nearest the edge of all' : '',
    verdictWords[verdict],
    ...columns.map((quantity, i) => spokenNumber(quantity, numbers[i])),
    basisWords[basis].tag,
  ];
  const look = { borderBottomColor: colors.rule, backgroundColor: id === selected ? colors.bar : colors.paper };
  return (
    <View role="listitem">
      <Pressable
        role="button"
        aria-label={label.filter(Boolean).join(', ')}
        aria-current={id === selected ? 'true' : undefined}
        onPress={() => onOpen(id)}
        style={[styles.row, look, isWorst && { borderLeftWidth: 4, borderLeftColor: colors.ink }]}
      >
        <View style={styles.head}>
          <BasisMark basis={basis} />
          <Text weight={isWorst ? 700 : 600} style={styles.name} numberOfLines={2}>
            {name}
          </Text>
          <VerdictWord verdict={verdict} />
        </View>
        <View style={styles.numbers}>
          {numbers.map((number, i) => (
            <View key={columns[i]} style={styles.number}>
              <Text step="small" tone="ink2">
                {quantityName(columns[i])}
              </Text>
              <Text step="small" weight={600} tone={view.outdated ? 'ink3' : 'ink'}>
                {number.text}
              </Text>
              {number.verdict ? <VerdictGlyph verdict={number.verdict} size={14} /> : null}
            </View>
          ))}
        </View>
      </Pressable>
    </View>
  );
});

const styles = StyleSheet.create({
  row: { minHeight: 56, paddingHorizontal: gutter.phone, paddingVertical: 8, gap: 4, borderBottomWidth: 1 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 8 },
  name: { flex: 1 },
  numbers: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 14, rowGap: 2 },
  number: { flexDirection: 'row', alignItems: 'center', gap: 5 },
});
