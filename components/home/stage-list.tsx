import { useQuery } from '@tanstack/react-query';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { casesQuery } from '@/hooks/queries/cases';
import { designsQuery } from '@/hooks/queries/designs';
import { limitsQuery } from '@/hooks/queries/limits';
import { plantsQuery } from '@/hooks/queries/plants';
import { type Stage, stages } from './stages';

function StageRow({ stage, last }: { stage: Stage; last: boolean }) {
  const { colors } = useTheme();
  const dot = { borderColor: colors.ink, backgroundColor: stage.done ? colors.ink : colors.paper };
  return (
    <View role="listitem" style={styles.row}>
      {last ? null : <View style={[styles.line, { backgroundColor: colors.ink }]} />}
      <View style={[styles.dot, dot]} />
      <Text step="h3">{stage.name}</Text>
      <Text step="note" tone="ink2">
        {stage.state}
      </Text>
    </View>
  );
}

/** Where the project stands between a plant and a driven car. */
export function StageList() {
  const { id, latestAnalysis } = useProject();
  const plants = useQuery(plantsQuery(id));
  const cases = useQuery(casesQuery(id));
  const designs = useQuery(designsQuery(id));
  const limits = useQuery(limitsQuery(id));
  const known = plants.data &&
    cases.data &&
    designs.data &&
    limits.data && { plants: plants.data, cases: cases.data, designs: designs.data, limits: limits.data.items };
  const awaited = [plants, cases, designs, limits].find(({ data }) => data === undefined) ?? plants;
  return (
    <View style={styles.section}>
      <Heading level={2}>Where it stands</Heading>
      <QueryView query={{ ...awaited, data: known }} waiting="Fetching the stages">
        {(facts) => (
          <View role="list">
            {stages({ ...facts, analysedAt: latestAnalysis?.createdAt ?? null, now: new Date() }).map((stage, i, { length }) => (
              <StageRow key={stage.name} stage={stage} last={i === length - 1} />
            ))}
          </View>
        )}
      </QueryView>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 10 },
  row: { paddingLeft: 30, paddingBottom: 14, minHeight: 48 },
  line: { position: 'absolute', left: 8, top: 8, bottom: -8, width: 2 },
  dot: { position: 'absolute', left: 2, top: 4, width: 14, height: 14, borderRadius: 7, borderWidth: 2 },
});
