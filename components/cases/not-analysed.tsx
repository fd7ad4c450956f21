import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import type { DesignRevision } from '@/contract';
import { designsQuery } from '@/hooks/queries/designs';
import { AnalyseAgain, countOf } from './analyse-again';

const newest = (designs: readonly DesignRevision[]) =>
  designs.reduce<DesignRevision | null>((found, next) => (found === null || next.createdAt > found.createdAt ? next : found), null);

/** No number stands over these cases yet: what would bring one. */
export function NotAnalysed({ caseCount }: { caseCount: number }) {
  const { id } = useProject();
  const mayEdit = useMayEdit();
  const router = useRouter();
  const { data: designs } = useQuery(designsQuery(id));
  const design = newest(designs ?? []);
  const analyse = design ? (
    <AnalyseAgain design={design} caseCount={caseCount} label={`Analyse ${design.name}, rev ${design.revision}`} />
  ) : (
    <Button kind="primary" label="Open the bench" onPress={() => router.push(projectPath(id, 'bench'))} />
  );
  return (
    <Empty
      title="Nothing analysed yet"
      text={`${countOf(caseCount)}, and no design was analysed over ${caseCount === 1 ? 'it' : 'them'}. Keep gains on the bench, and the worst of them stands here.`}
      action={mayEdit ? analyse : null}
    />
  );
}
