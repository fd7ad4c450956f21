import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { sentence } from '@/hooks/api/problem';
import { useCreateAnalysis } from '@/hooks/queries/analyses';
import { useSignal } from '@/hooks/use-signal';

export interface AnalyseAgainProps {
  design: { id: string; name: string; revision: number };
  caseCount: number;
  label: string;
}

export const countOf = (cases: number): string => (cases === 1 ? '1 case' : `${cases} cases`);

/** Has the server analyse a kept revision over the cases and limits of now, and keep that. */
export function AnalyseAgain({ design, caseCount, label }: AnalyseAgainProps) {
  const project = useProject();
  const signal = useSignal();
  const announce = useAnnounce();
  const analyse = useCreateAnalysis(project.id);
  const run = () =>
    analyse.mutate(
      { designId: design.id, designRevision: design.revision },
      { onSuccess: () => announce(`${design.name}, rev ${design.revision}, analysed over ${countOf(caseCount)}.`) },
    );
  return (
    <View style={{ gap: 4 }}>
      <Button
        kind="primary"
        label={label}
        busyLabel={`Computing ${countOf(caseCount)}`}
        busy={analyse.isPending}
        disabled={!signal}
        onPress={run}
      />
      {analyse.error ? (
        <Text role="alert" step="note" tone="fail">
          {sentence(analyse.error)}
        </Text>
      ) : null}
    </View>
  );
}
