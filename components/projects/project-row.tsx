import { StyleSheet, View } from 'react-native';
import { NavLink } from '@/components/navigation/nav-link';
import { projectPath } from '@/components/navigation/routes';
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
export function ProjectColumns() {
  const { colors } = useTheme();
  const columns = [
    ['project, car', styles.name],
    ['worst margin over all cases', styles.margin],
    ['kept last', styles.kept],
    ['next step', styles.next],
  ] as const;
  return (
    <View style={[styles.head, { backgroundColor: colors.paper, borderBottomColor: colors.ink }]}>
      {columns.map(([name, style]) => (
        <Text key={name} step="small" tone="ink3" style={style}>
          {name}
        </Text>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1 },
  wide: { flexDirection: 'row', alignItems: 'center', gap: 20, minHeight: 88, paddingHorizontal: gutter.wide, paddingVertical: 14 },
  phone: { paddingHorizontal: 14, paddingVertical: 14, gap: 6 },
  phoneName: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: 8 },
  head: { flexDirection: 'row', alignItems: 'center', gap: 20, height: 40, paddingHorizontal: gutter.wide, borderBottomWidth: 1.5 },
  name: { flex: 5 },
  margin: { flex: 9 },
  kept: { flex: 5 },
  next: { flex: 5 },
});
