import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter, line, touch } from '@/components/ui/tokens';
import { useUnits } from '@/components/ui/units';
import { useLayout } from '@/components/ui/use-layout';
import { AccountCircle } from './account-circle';
import { Brand } from './brand';
import { NavLink } from './nav-link';

/** The bar over every page from 700 on: the brand leads to the projects, the units and the circle to the account. */
export function TopBar({ children }: PropsWithChildren) {
  const { colors } = useTheme();
  const units = useUnits();
  const wide = useLayout() === 'wide';
  const named = [units.frequency, units.magnitude, units.speed].join(', ');
  return (
    <View role="banner" style={[styles.bar, { backgroundColor: colors.paper, borderBottomColor: colors.ink }]}>
      <Brand />
      {children}
      <View style={styles.right}>
        {wide && (
          <NavLink href="/account" aria-label={`Units: ${named}. Change`} style={styles.units}>
            <Text weight={600}>{named}</Text>
          </NavLink>
        )}
        <AccountCircle />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    height: 56,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 22,
    paddingHorizontal: gutter.wide,
    borderBottomWidth: line.head,
    zIndex: 10,
  },
  right: { marginLeft: 'auto', flexDirection: 'row', alignItems: 'center', gap: 8 },
  units: { minHeight: touch, justifyContent: 'center', paddingHorizontal: 14 },
});
