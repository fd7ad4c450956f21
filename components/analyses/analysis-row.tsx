import { StyleSheet, View } from 'react-native';
import { NavLink } from '@/components/navigation/nav-link';
import { analysisPath } from '@/components/navigation/routes';
import { ColumnHeads } from '@/components/ui/column-heads';
import { moment } from '@/components/ui/moment';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictWord } from '@/components/ui/verdict-word';
import { headlineText } from '@/components/verdict/headline-text';
import type { AnalysisSummary } from '@/contract';

const over = ({ caseCount, plants }: AnalysisSummary) =>
  [caseCount === 1 ? '1 case' : `${caseCount} cases`, ...plants.map(({ name, revision }) => `${name} rev ${revision}`)].join(', ');

/** One kept analysis: which gains, how near the edge, over what it was computed, by whom. */
export function AnalysisRow({ projectId, analysis }: { projectId: string; analysis: AnalysisSummary }) {
  const { colors } = useTheme();
  const { quantity, value, limit } = headlineText(analysis.headline, useUnits());
  const phone = useLayout() === 'phone';
  const number = [quantity, value].filter(Boolean).join(' ');
  const when = moment(analysis.createdAt, new Date(), true);
  const revision = `${analysis.design.name}, rev ${analysis.design.revision}`;
  const aside = limit ?? analysis.headline.reason;
  const frame = { backgroundColor: colors.paper, borderBottomColor: phone ? colors.rule2 : colors.rule };
  if (phone) {
    return (
      <NavLink href={analysisPath(projectId, analysis.id)} style={[styles.phone, frame]}>
        <View style={styles.grow}>
          <Text weight={600}>{revision}</Text>
          <Text step="note" tone="ink2">
            {when}
          </Text>
          <Text step="note" tone="ink2">
            {over(analysis)}
          </Text>
        </View>
        <View style={styles.right}>
          <VerdictWord verdict={analysis.verdict} />
          <Text step="h3">{number}</Text>
        </View>
      </NavLink>
    );
  }
  return (
    <NavLink href={analysisPath(projectId, analysis.id)} style={[styles.wide, frame]}>
      <Text weight={600} style={styles.design}>
        {revision}
      </Text>
      <View style={styles.verdict}>
        <VerdictWord verdict={analysis.verdict} />
      </View>
      <View style={styles.number}>
        <Text step="h3">{number}</Text>
        {aside ? (
          <Text step="small" tone="ink2">
            {aside}
          </Text>
        ) : null}
      </View>
      <Text style={styles.case}>{analysis.headline.case?.name ?? '–'}</Text>
      <Text tone="ink2" style={styles.over}>
        {over(analysis)}
      </Text>
      <View style={styles.when}>
        <Text tone="ink2">{when}</Text>
        <Text step="note" tone="ink2">
          {analysis.createdBy}
        </Text>
      </View>
    </NavLink>
  );
}

/** The names of the columns, over the rows of a wide list. */
export const AnalysisColumns = () => <ColumnHeads gap={COLUMN_GAP} columns={columns} />;

/** Between the columns of a wide row, px. */
const COLUMN_GAP = 14;

const styles = StyleSheet.create({
  wide: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: COLUMN_GAP,
    minHeight: 62,
    paddingHorizontal: gutter.wide,
    paddingVertical: 8,
    borderBottomWidth: 1,
  },
  phone: { flexDirection: 'row', gap: 12, alignItems: 'center', padding: gutter.phone, borderBottomWidth: 1 },
  grow: { flex: 1, gap: 1 },
  right: { alignItems: 'flex-end', gap: 4 },
  design: { flex: 4 },
  verdict: { flex: 3 },
  number: { flex: 5, gap: 2 },
  case: { flex: 3 },
  over: { flex: 5 },
  when: { flex: 3, gap: 1 },
});

const columns = [
  ['design', styles.design],
  ['verdict', styles.verdict],
  ['worst over its cases', styles.number],
  ['case', styles.case],
  ['computed over', styles.over],
  ['when, by', styles.when],
] as const;
