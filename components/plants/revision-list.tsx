import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { moment } from '@/components/ui/moment';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { PlantRevision } from '@/contract';
import { plantRevisionsQuery } from '@/hooks/queries/plants';
import { PlantReading } from './plant-reading';

/** Every revision of a plant, newest first; none of them ever changes. */
export function RevisionList({ plantId }: { plantId: string }) {
  const { colors } = useTheme();
  const project = useProject();
  const revisions = useQuery(plantRevisionsQuery(project.id, plantId));
  const [shown, show] = useState<PlantRevision | null>(null);
  return (
    <View style={styles.section}>
      <Heading level={2}>Revisions</Heading>
      <QueryView query={revisions} waiting="Fetching revisions">
        {(items) => (
          <View role="list">
            {items.map((item) => (
              <View key={item.revision} role="listitem" style={[styles.row, { borderBottomColor: colors.rule }]}>
                <View style={styles.text}>
                  <Text weight={600}>{`Rev ${item.revision}`}</Text>
                  <Text step="note" tone="ink2">
                    {`${moment(item.createdAt, new Date(), true)}, ${item.createdBy}${item.note ? `. ${item.note}` : ''}`}
                  </Text>
                </View>
                <Button kind="quiet" label="Show" aria-label={`Show rev ${item.revision}`} onPress={() => show(item)} />
              </View>
            ))}
          </View>
        )}
      </QueryView>
      <Dialog open={shown !== null} title={shown ? `${shown.name}, rev ${shown.revision}` : ''} onClose={() => show(null)}>
        {shown ? <PlantReading plant={shown} /> : null}
        <Button label="Close" onPress={() => show(null)} stretch />
      </Dialog>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 4 },
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 52, borderBottomWidth: 1 },
  text: { flex: 1 },
});
