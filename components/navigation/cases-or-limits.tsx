import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line, touch } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { NavLink } from './nav-link';
import { PhoneActions } from './phone-actions';
import { useProject } from './project-context';
import { projectPath } from './routes';

const sides = [
  ['cases', 'Cases'],
  ['limits', 'Limits'],
] as const;

/** What the loop must survive, and what is demanded of it there: two sides of one page. On a phone Cases leads to Limits, and back leads back. */
export function CasesOrLimits({ current }: { current: 'cases' | 'limits' }) {
  const { colors } = useTheme();
  const { id } = useProject();
  const phone = useLayout() === 'phone';
  if (phone) {
    return current === 'limits' ? null : (
      <PhoneActions>
        <NavLink href={projectPath(id, 'limits')} style={styles.phone}>
          <Text weight={600}>Limits</Text>
        </NavLink>
      </PhoneActions>
    );
  }
  return (
    <View role="navigation" aria-label="Cases or limits" style={styles.group}>
      {sides.map(([page, name], index) => {
        const here = page === current;
        const look = { borderColor: here ? colors.ink : colors.rule2, backgroundColor: here ? colors.ink : 'transparent' };
        return (
          <NavLink
            key={page}
            href={projectPath(id, page)}
            replace
            aria-current={here ? 'page' : undefined}
            style={[styles.side, index > 0 && styles.joined, look]}
          >
            <Text weight={here ? 600 : 500} tone={here ? 'paper' : 'ink'}>
              {name}
            </Text>
          </NavLink>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  group: { flexDirection: 'row' },
  side: { minHeight: touch, minWidth: 88, paddingHorizontal: 12, borderWidth: line.field, alignItems: 'center', justifyContent: 'center' },
  joined: { marginLeft: -line.field },
  phone: { minHeight: touch, minWidth: touch, paddingHorizontal: 10, justifyContent: 'center' },
});
