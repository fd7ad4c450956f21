import { useInfiniteQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { ActivityRows } from '@/components/activity/activity-rows';
import { useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { QueryView } from '@/components/ui/query-view';
import { activityQuery } from '@/hooks/queries/projects';
import { SectionHead } from './section-head';

const SHOWN = 5;

/** What was done last; the rest stands on a page of its own. */
export function Lately() {
  const { id } = useProject();
  const activity = useInfiniteQuery(activityQuery(id));
  const more = activity.hasNextPage || (activity.data?.length ?? 0) > SHOWN;
  return (
    <View>
      <SectionHead name="Lately" {...(more && { link: 'All of it', href: projectPath(id, 'activity') })} />
      <QueryView query={activity} waiting="Fetching what happened">
        {(items) => <ActivityRows items={items.slice(0, SHOWN)} />}
      </QueryView>
    </View>
  );
}
