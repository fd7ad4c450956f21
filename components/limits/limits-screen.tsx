import { useQuery } from '@tanstack/react-query';
import { useProject } from '@/components/navigation/project-context';
import { CasesOrLimits } from '@/components/navigation/cases-or-limits';
import { DocumentTitle } from '@/components/ui/document-title';
import { Page } from '@/components/ui/page';
import { QueryView } from '@/components/ui/query-view';
import { limitsQuery } from '@/hooks/queries/limits';
import { LimitsPage } from './limits-page';

/** How often it is asked whether someone else has changed them. */
const LOOK_AGAIN_MS = 15_000;

/** What is demanded of the loop, noticed soon after somebody else changes it. */
export function LimitsScreen() {
  const { id, name } = useProject();
  const limits = useQuery({ ...limitsQuery(id), refetchInterval: LOOK_AGAIN_MS, refetchOnWindowFocus: 'always' });
  return (
    <>
      <DocumentTitle parts={['Limits', name]} />
      {limits.data ? (
        <LimitsPage key={id} kept={limits.data} />
      ) : (
        <Page title="Limits" actions={<CasesOrLimits current="limits" />}>
          <QueryView query={limits} waiting="Fetching the limits">
            {() => null}
          </QueryView>
        </Page>
      )}
    </>
  );
}
