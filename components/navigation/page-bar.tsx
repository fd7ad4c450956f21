import { StyleSheet, View } from 'react-native';
import { Icon } from '@/components/ui/icon';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { NavLink } from './nav-link';
import { pages } from './pages';
import type { ProjectTabsProps } from './project-tabs';
import { projectPath } from './routes';

/** The project's pages in reach of a thumb; the page one is on has an ink bar above. */
export function PageBar({ projectId, current }: ProjectTabsProps) {
  const { colors } = useTheme();
  return (
    <View
      role="navigation"
      aria-label="Pages of the project"
      style={[styles.bar, { backgroundColor: colors.paper, borderTopColor: colors.ink }]}
    >
      {pages.map(({ page, name, icon }) => {
        const here = page === current;
        const tone = here ? 'ink' : 'ink3';
        return (
          <NavLink
            key={page}
            href={projectPath(projectId, page)}
            replace
            aria-current={here ? 'page' : undefined}
            style={[styles.item, { borderTopColor: here ? colors.ink : 'transparent' }]}
          >
            <Icon name={icon} tone={tone} />
            <Text step="tick" weight={here ? 700 : 500} tone={tone}>
              {name}
            </Text>
          </NavLink>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { height: 60, flexDirection: 'row', borderTopWidth: line.head },
  item: { flex: 1, alignItems: 'center', justifyContent: 'center', gap: 3, borderTopWidth: 4, paddingBottom: 4 },
});
