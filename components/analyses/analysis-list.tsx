import { useInfiniteQuery } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
import { View } from 'react-native';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { DocumentTitle } from '@/components/ui/document-title';
import { Empty } from '@/components/ui/empty';
import { Note } from '@/components/ui/note';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { useLayout } from '@/components/ui/use-layout';
import { analysesQuery } from '@/hooks/queries/analyses';
import { AnalysisColumns, AnalysisRow } from './analysis-row';

/** Everything that was kept in the project, newest first. */
export function AnalysisList() {
  const project = useProject();
  const mayEdit = useMayEdit();
  const router = useRouter();
  const phone = useLayout() === 'phone';
  const analyses = useInfiniteQuery(analysesQuery(project.id));
  const bench = <Button label="Open the bench" onPress={() => router.push(projectPath(project.id, 'bench'))} />;
  return (
    <Page title="Analyses">
      <DocumentTitle parts={['Analyses', project.name]} />
      <QueryView query={analyses} waiting="Fetching analyses">
        {(items) =>
          items.length === 0 ? (
            <Paper>
              <Empty
                title="Nothing kept yet"
                text="Gains that are kept on the bench are analysed by the server, and stand here for good."
                action={mayEdit ? bench : null}
              />
            </Paper>
          ) : (
            <View>
              {phone ? null : <AnalysisColumns />}
              {items.map((analysis) => (
                <AnalysisRow key={analysis.id} projectId={project.id} analysis={analysis} />
              ))}
            </View>
          )
        }
      </QueryView>
      {analyses.hasNextPage ? (
        <Button label="Earlier analyses" busy={analyses.isFetchingNextPage} onPress={() => analyses.fetchNextPage()} />
      ) : null}
      <Paper>
        <Note lead="An analysis never changes.">Computed again by the same engine it comes out the same.</Note>
      </Paper>
    </Page>
  );
}
