import { ScrollView } from 'react-native';
import { LatestPlane } from '@/components/navigation/loop-screens';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { Column, Columns } from '@/components/ui/columns';
import { DocumentTitle } from '@/components/ui/document-title';
import { useTheme } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';
import { About } from './about';
import { HomeStrip } from './home-strip';
import { Lately } from './lately';
import { LimitsList } from './limits-list';
import { NextBox } from './next-box';
import { OwnerSection } from './owner-section';
import { People } from './people';
import { StageList } from './stage-list';

const WIDTHS = { stages: { middle: 340, wide: 380 }, lately: 400 };

/** Where a project stands: the number first, the next step, and how it came here. */
export function HomeScreen() {
  const { colors } = useTheme();
  const layout = useLayout();
  const project = useProject();
  const mayEdit = useMayEdit();
  const phone = layout === 'phone';
  const wide = layout === 'wide';
  const plane = project.latestAnalysis && project.headline ? <LatestPlane height={phone ? 400 : 640} /> : null;
  return (
    <ScrollView style={{ backgroundColor: colors.paper }} contentContainerStyle={{ flexGrow: 1 }}>
      <DocumentTitle parts={[project.name]} />
      <HomeStrip />
      <Columns>
        <Column width={wide ? WIDTHS.stages.wide : WIDTHS.stages.middle}>
          {mayEdit ? <NextBox /> : null}
          <StageList />
          {phone ? null : <People />}
        </Column>
        {wide ? <Column>{plane}</Column> : null}
        <Column width={wide ? WIDTHS.lately : undefined} last>
          {wide ? null : plane}
          <About />
          <LimitsList />
          <Lately />
          {phone ? <People /> : null}
          {project.role === 'owner' ? <OwnerSection /> : null}
        </Column>
      </Columns>
    </ScrollView>
  );
}
