import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { CasesOrLimits } from '@/components/navigation/cases-or-limits';
import { projectPath } from '@/components/navigation/routes';
import { useRouter } from 'expo-router';
import { Button } from '@/components/ui/button';
import { DocumentTitle } from '@/components/ui/document-title';
import { Empty } from '@/components/ui/empty';
import { HiddenHeading } from '@/components/ui/hidden-heading';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { useLayout } from '@/components/ui/use-layout';
import { CasesPage } from './cases-page';
import { useCaseData } from './use-case-data';

/** Everything that the loop must survive, by its address: which case is nearest the edge, and what may be changed about them. */
export function CasesScreen() {
  const project = useProject();
  const phone = useLayout() === 'phone';
  const data = useCaseData(project);
  return (
    <>
      <DocumentTitle parts={['Cases', project.name]} />
      {phone ? null : <HiddenHeading>{`Cases, ${project.name}`}</HiddenHeading>}
      <QueryView query={data} waiting="Fetching the cases">
        {(cases) => (cases.views.length === 0 ? <NoCases /> : <CasesPage data={cases} />)}
      </QueryView>
    </>
  );
}

/** The first plant brings the first case with it. */
function NoCases() {
  const { id } = useProject();
  const mayEdit = useMayEdit();
  const router = useRouter();
  return (
    <Page>
      <Paper>
        <Empty
          title="No case yet"
          text={
            mayEdit
              ? 'A case is a plant under one condition. The first plant brings the first case.'
              : 'An editor of the project enters the plant; the first case comes with it.'
          }
          action={mayEdit ? <Button kind="primary" label="Enter the plant" onPress={() => router.push(projectPath(id, 'plant'))} /> : null}
        />
      </Paper>
      <CasesOrLimits current="cases" />
    </Page>
  );
}
