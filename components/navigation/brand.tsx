import { StyleSheet } from 'react-native';
import { BrandMark } from '@/components/ui/brand-mark';
import { Text } from '@/components/ui/text';
import { touch } from '@/components/ui/tokens';
import { NavLink } from './nav-link';

export function Brand() {
  return (
    <NavLink href="/" aria-label="Kerbline, all projects" style={styles.brand}>
      <BrandMark />
      <Text step="h2" weight={700}>
        Kerbline
      </Text>
    </NavLink>
  );
}

const styles = StyleSheet.create({
  brand: { flexDirection: 'row', alignItems: 'center', gap: 8, minHeight: touch },
});
