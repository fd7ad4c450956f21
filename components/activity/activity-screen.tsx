import { useInfiniteQuery } from '@tanstack/react-query';
import { useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { DocumentTitle } from '@/components/ui/document-title';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { Text } from '@/components/ui/text';
import { activityQuery } from '@/hooks/queries/projects';
import { ActivityRows } from './activity-rows';

/** Everything that was done in the project, back to its beginning. */
export function ActivityScreen() {
  const { id, name } = useProject();
  const activity = useInfiniteQuery(activityQuery(id));
  return (
    <Page title="Activity" sub={name} width={760} scrolledAs="Activity">
      <DocumentTitle parts={['Activity', name]} />
      <Paper style={{ gap: 10 }}>
        <QueryView query={activity} waiting="Fetching what happened">
          {(items) => <ActivityRows items={items} withClock />}
        </QueryView>
        {activity.hasNextPage ? (
          <Button label="Earlier" busyLabel="Fetching" busy={activity.isFetchingNextPage} onPress={() => activity.fetchNextPage()} />
        ) : activity.data ? (
          <Text step="note" tone="ink2">
            This is where it begins.
          </Text>
        ) : null}
      </Paper>
    </Page>
  );
}
