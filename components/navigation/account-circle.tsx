import { StyleSheet } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line, touch } from '@/components/ui/tokens';
import { useMe } from '@/hooks/queries/me';
import { initials } from './initials';
import { NavLink } from './nav-link';

export function AccountCircle() {
  const { colors } = useTheme();
  const { name } = useMe();
  return (
    <NavLink
      href="/account"
      aria-label={`Account, ${name}`}
      style={[styles.circle, { borderColor: colors.ink, backgroundColor: colors.paper }]}
    >
      <Text step="note" weight={600}>
        {initials(name)}
      </Text>
    </NavLink>
  );
}

const styles = StyleSheet.create({
  circle: { width: touch, height: touch, borderRadius: touch / 2, borderWidth: line.field, alignItems: 'center', justifyContent: 'center' },
});
