import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { mostCases } from '@/contract';
import type { CaseView } from './model/case-view';

/** The two ways to more cases, for those who may. */
export function MakeCases({ views, onEdit }: { views: readonly CaseView[]; onEdit: (what: string) => void }) {
  const full = views.length >= mostCases;
  return (
    <View style={styles.line}>
      <Button label="Add a case" icon="plus" disabled={full} onPress={() => onEdit('new')} />
      <Button label="Make a grid" icon="cases" onPress={() => onEdit('grid')} />
      <Text step="small" tone="ink2">
        {full ? `${mostCases} cases are the most.` : `${views.length} of at most ${mostCases}.`}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({ line: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: 10 } });
