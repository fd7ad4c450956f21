import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams, useRouter } from 'expo-router';
import { View } from 'react-native';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { DocumentTitle } from '@/components/ui/document-title';
import { Empty } from '@/components/ui/empty';
import { Menu } from '@/components/ui/menu';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { plantsQuery } from '@/hooks/queries/plants';
import { PlantEditor } from './plant-editor';
import { PlantPage } from './plant-page';

/** The project's plant by its address; where there are several, `?plant=` names one. */
export function PlantScreen() {
  const project = useProject();
  const mayEdit = useMayEdit();
  const router = useRouter();
  const { plant: wanted } = useLocalSearchParams<{ plant?: string }>();
  const plants = useQuery(plantsQuery(project.id));
  return (
    <>
      <DocumentTitle parts={['Plant', project.name]} />
      <QueryView query={plants} waiting="Fetching the plant">
        {(items) => {
          const plant = items.find(({ id }) => id === wanted) ?? items[items.length - 1];
          if (!plant && !mayEdit) {
            return (
              <Page title="Plant">
                <Paper>
                  <Empty title="No plant yet" text="An editor of the project enters it." />
                </Paper>
              </Page>
            );
          }
          const others = items.map(({ id, name }) => ({
            key: id,
            label: name,
            current: id === plant?.id,
            onSelect: () => router.setParams({ plant: id }),
          }));
          return (
            <View style={{ flex: 1, minHeight: 0 }}>
              {others.length > 1 ? <Menu label={plant.name} kind="quiet" items={others} /> : null}
              {mayEdit ? <PlantEditor key={`${plant?.id} ${plant?.revision}`} latest={plant} /> : <PlantPage plant={plant} />}
            </View>
          );
        }}
      </QueryView>
    </>
  );
}
