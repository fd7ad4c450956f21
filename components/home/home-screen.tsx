import { ScrollView, StyleSheet, View } from 'react-native';
import { LatestPlane } from '@/components/navigation/loop-screens';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { DocumentTitle } from '@/components/ui/document-title';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictStrip } from '@/components/verdict/verdict-strip';
import { Lately } from './lately';
import { NextBox } from './next-box';
import { OwnerSection } from './owner-section';
import { People } from './people';
import { StageList } from './stage-list';
import { useLatestCaseCount } from './use-latest-case-count';

/** Where a project stands: the number first, the next step, and how it came here. */
export function HomeScreen() {
  const { colors } = useTheme();
  const layout = useLayout();
  const project = useProject();
  const mayEdit = useMayEdit();
  const caseCount = useLatestCaseCount();
  const phone = layout === 'phone';
  const column = [styles.column, phone ? styles.phoneColumn : { borderRightColor: colors.rule, borderRightWidth: 1 }];
  const plane = project.latestAnalysis && project.headline ? <LatestPlane height={phone ? 400 : 640} /> : null;
  return (
    <ScrollView style={{ backgroundColor: colors.paper }}>
      <DocumentTitle parts={[project.name]} />
      {project.headline && caseCount !== null ? <VerdictStrip headline={project.headline} caseCount={caseCount} /> : null}
      {project.archived ? <Banner lead="Archived." text="It can be read; nothing changes in it." /> : null}
      <View style={phone ? null : styles.side}>
        <View style={[column, !phone && styles.left]}>
          {mayEdit ? <NextBox /> : null}
          <StageList />
          {phone ? null : <People />}
        </View>
        {layout === 'wide' ? <View style={[column, styles.middle]}>{plane}</View> : null}
        <View style={[styles.column, phone ? styles.phoneColumn : layout === 'wide' ? styles.right : styles.rest]}>
          {layout === 'wide' ? null : plane}
          {project.description ? <Text step="prose">{project.description}</Text> : null}
          <Lately />
          {phone ? <People /> : null}
          {project.role === 'owner' ? <OwnerSection /> : null}
        </View>
      </View>
    </ScrollView>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', minHeight: 700 },
  column: { padding: gutter.wide, gap: 26 },
  phoneColumn: { padding: 14 },
  left: { width: 360 },
  middle: { flex: 1 },
  right: { width: 400 },
  rest: { flex: 1 },
});
