import { useQuery } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { type Fact, FactTable } from '@/components/ui/fact-table';
import { QueryView } from '@/components/ui/query-view';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/components/ui/units';
import { demandText } from '@/components/verdict/demand-text';
import type { Limit } from '@/contract';
import { demandedText, quantityName, type ReaderUnits } from '@/figures/quantity-text';
import { limitsQuery } from '@/hooks/queries/limits';
import { SectionHead } from './section-head';

const factOf = (limit: Limit, units: ReaderUnits): Fact => ({
  name: quantityName(limit.quantity),
  value: demandText(limit, units),
  aside: limit.target === null ? limit.source : `target ${demandedText(limit.quantity, limit.target, units)}`,
});

/** What the project demands, and the way to change it. */
export function LimitsList() {
  const { id } = useProject();
  const units = useUnits();
  const mayEdit = useMayEdit();
  const limits = useQuery(limitsQuery(id));
  return (
    <View style={styles.section}>
      <SectionHead name="Limits" link={mayEdit ? 'Change' : 'Open'} href={projectPath(id, 'limits')} />
      <QueryView query={limits} waiting="Fetching the limits">
        {({ items }) =>
          items.length === 0 ? (
            <Text tone="ink2">Nothing is demanded yet, so nothing is judged.</Text>
          ) : (
            <FactTable label="Limits" facts={items.map((limit) => factOf(limit, units))} />
          )
        }
      </QueryView>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 6 },
});
