import { useInfiniteQuery } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { moment } from '@/components/ui/moment';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { activityQuery } from '@/hooks/queries/projects';

/** Who did what, newest first. */
export function Lately() {
  const { colors } = useTheme();
  const { id } = useProject();
  const activity = useInfiniteQuery(activityQuery(id));
  return (
    <View style={styles.section}>
      <Heading level={2}>Lately</Heading>
      <QueryView query={activity} waiting="Fetching what happened">
        {(items) => (
          <View role="list">
            {items.map(({ id: key, at, by, summary, detail }) => (
              <View key={key} role="listitem" style={[styles.row, { borderBottomColor: colors.rule }]}>
                <Text step="note" tone="ink2" style={styles.when}>
                  {moment(at, new Date())}
                </Text>
                <View style={styles.what}>
                  <Text weight={600}>{`${by} ${summary}`}</Text>
                  {detail ? (
                    <Text step="note" tone="ink2">
                      {detail}
                    </Text>
                  ) : null}
                </View>
              </View>
            ))}
          </View>
        )}
      </QueryView>
      {activity.hasNextPage ? (
        <Button kind="quiet" label="Earlier" busy={activity.isFetchingNextPage} onPress={() => activity.fetchNextPage()} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 6 },
  row: { flexDirection: 'row', gap: 10, paddingVertical: 10, borderBottomWidth: 1 },
  when: { width: 76 },
  what: { flex: 1, gap: 2 },
});
