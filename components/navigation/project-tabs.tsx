import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { pages } from './pages';
import { NavLink } from './nav-link';
import { type ProjectPage, projectPath } from './routes';

export interface ProjectTabsProps {
  projectId: string;
  current: ProjectPage;
}

/** The project's pages in the bar on top. */
export function ProjectTabs({ projectId, current }: ProjectTabsProps) {
  const { colors } = useTheme();
  return (
    <View role="navigation" aria-label="Pages of the project" style={styles.tabs}>
      {pages.map(({ page, name }) => {
        const here = page === current;
        return (
          <NavLink key={page} href={projectPath(projectId, page)} aria-current={here ? 'page' : undefined} style={styles.tab}>
            <Text weight={here ? 700 : 500} tone={here ? 'ink' : 'ink2'}>
              {name}
            </Text>
            <View style={[styles.mark, { backgroundColor: here ? colors.ink : 'transparent' }]} />
          </NavLink>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  tabs: { flexDirection: 'row', alignSelf: 'stretch', gap: 2 },
  tab: { justifyContent: 'center', alignItems: 'center', paddingHorizontal: 12, minWidth: 44 },
  mark: { position: 'absolute', left: 10, right: 10, bottom: 0, height: 4 },
});
