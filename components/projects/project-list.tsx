import { useInfiniteQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { View } from 'react-native';
import { AccountCircle } from '@/components/navigation/account-circle';
import { DeskFrame } from '@/components/navigation/desk-frame';
import { Button } from '@/components/ui/button';
import { DocumentTitle } from '@/components/ui/document-title';
import { Empty } from '@/components/ui/empty';
import { IconButton } from '@/components/ui/icon-button';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { useLayout } from '@/components/ui/use-layout';
import { projectsQuery } from '@/hooks/queries/projects';
import { CreateProjectDialog } from './create-project-dialog';
import { ProjectColumns, ProjectRow } from './project-row';

/** Every project one may see; the archived ones apart. */
export function ProjectList() {
  const [archived, setArchived] = useState(false);
  const [creating, setCreating] = useState(false);
  const phone = useLayout() === 'phone';
  const projects = useInfiniteQuery(projectsQuery(archived));
  const create = () => setCreating(true);
  const other = <Button kind="quiet" label={archived ? 'Projects at work' : 'Archived'} onPress={() => setArchived(!archived)} />;
  const actions = (
    <>
      {other}
      <Button kind="primary" label="New project" onPress={create} />
    </>
  );
  const phoneActions = (
    <>
      <IconButton icon="plus" label="New project" onPress={create} />
      <AccountCircle />
    </>
  );
  const empty = archived ? (
    <Empty title="Nothing archived" text="A project that is done can be archived on its home." />
  ) : (
    <Empty
      title="No project yet"
      text="A project is one loop on one vehicle: its plant, its gains, what was kept."
      action={<Button label="New project" onPress={create} />}
    />
  );
  return (
    <DeskFrame title={archived ? 'Archived' : 'Projects'} phoneActions={phoneActions}>
      <DocumentTitle parts={[archived ? 'Archived projects' : 'Projects']} />
      <Page title={archived ? 'Archived projects' : 'Projects'} actions={actions}>
        <QueryView query={projects} waiting="Fetching projects">
          {(items) =>
            items.length === 0 ? (
              <Paper>{empty}</Paper>
            ) : (
              <View>
                {!phone && <ProjectColumns />}
                {items.map((project) => (
                  <ProjectRow key={project.id} project={project} />
                ))}
              </View>
            )
          }
        </QueryView>
        {projects.hasNextPage ? (
          <Button label="More projects" busy={projects.isFetchingNextPage} onPress={() => projects.fetchNextPage()} />
        ) : null}
        {phone ? other : null}
      </Page>
      <CreateProjectDialog open={creating} onClose={() => setCreating(false)} />
    </DeskFrame>
  );
}
