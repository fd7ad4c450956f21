import { StyleSheet, View } from 'react-native';
import { NavLink } from '@/components/navigation/nav-link';
import { projectPath } from '@/components/navigation/routes';
import { ColumnHeads } from '@/components/ui/column-heads';
import { moment } from '@/components/ui/moment';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { HeadlineLine } from '@/components/verdict/headline-line';
import type { Project } from '@/contract';
import { nextStep } from './next-step';

const lastKept = ({ latestAnalysis }: Project) =>
  latestAnalysis
    ? `${latestAnalysis.design.name} rev ${latestAnalysis.design.revision}, ${moment(latestAnalysis.createdAt, new Date(), true)}`
    : 'nothing kept';

/** One project: what it is, how near the edge its worst case is, what was kept last, what it needs next. */
export function ProjectRow({ project }: { project: Project }) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const frame = { backgroundColor: colors.paper, borderBottomColor: colors.rule2 };
  return (
    <NavLink href={projectPath(project.id)} style={[styles.row, phone ? styles.phone : styles.wide, frame]}>
      <View style={phone ? styles.phoneName : styles.name}>
        <Text step="h2" weight={700}>
          {project.name}
        </Text>
        {project.vehicle ? <Text>{project.vehicle}</Text> : null}
      </View>
      <View style={phone ? null : styles.margin}>
        {project.headline ? <HeadlineLine headline={project.headline} /> : <Text tone="ink2">nothing analysed yet</Text>}
      </View>
      <Text step="note" tone="ink2" style={phone ? null : styles.kept}>
        {lastKept(project)}
      </Text>
      <Text weight={600} style={phone ? null : styles.next}>
        {nextStep(project)}
      </Text>
    </NavLink>
  );
}

/** The names of the columns, over the rows of a wide list. */
export const ProjectColumns = () => <ColumnHeads gap={COLUMN_GAP} columns={columns} />;

/** Between the columns of a wide row, px. */
const COLUMN_GAP = 20;

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1 },
  wide: { flexDirection: 'row', alignItems: 'center', gap: COLUMN_GAP, minHeight: 88, paddingHorizontal: gutter.wide, paddingVertical: 14 },
  phone: { paddingHorizontal: 14, paddingVertical: 14, gap: 6 },
  phoneName: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: 8 },
  name: { flex: 5 },
  margin: { flex: 9 },
  kept: { flex: 5 },
  next: { flex: 5 },
});

const columns = [
  ['project, car', styles.name],
  ['worst margin over all cases', styles.margin],
  ['kept last', styles.kept],
  ['next step', styles.next],
] as const;
