import { StyleSheet, View } from 'react-native';
import { Icon, type IconName } from '@/components/ui/icon';
import { Sheet } from '@/components/ui/sheet';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { NavLink, type NavLinkProps } from './nav-link';
import { allPages } from './pages';
import type { ProjectTabsProps } from './project-tabs';
import { projectPath } from './routes';

interface RowProps extends Pick<NavLinkProps, 'href' | 'onPress'> {
  icon: IconName;
  name: string;
  about: string;
  here?: boolean;
}

function PageRow({ icon, name, about, here = false, ...link }: RowProps) {
  const { colors } = useTheme();
  const look = { borderBottomColor: colors.rule, backgroundColor: here ? colors.bar : 'transparent' };
  return (
    <NavLink {...link} aria-current={here ? 'page' : undefined} style={[styles.row, look]}>
      <Icon name={icon} />
      <Text weight={600} style={styles.name}>
        {name}
      </Text>
      <Text step="note" tone="ink2" style={styles.about}>
        {about}
      </Text>
    </NavLink>
  );
}

export interface PagesSheetProps extends ProjectTabsProps {
  open: boolean;
  onClose: () => void;
}

/** All pages of the project and the account, as a sheet on the phone. */
export function PagesSheet({ projectId, current, open, onClose }: PagesSheetProps) {
  return (
    <Sheet open={open} label="Pages" onClose={onClose}>
      <View role="navigation" aria-label="All pages">
        {allPages.map(({ page, icon, name, about }) => (
          <PageRow
            key={page}
            icon={icon}
            name={name}
            about={about}
            href={projectPath(projectId, page)}
            here={page === current}
            onPress={onClose}
          />
        ))}
        <PageRow icon="account" name="Account" about="units, theme, keys" href="/account" onPress={onClose} />
      </View>
    </Sheet>
  );
}

const styles = StyleSheet.create({
  row: {
    minHeight: 52,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 14,
    borderBottomWidth: 1,
    marginHorizontal: -gutter.phone,
    paddingHorizontal: gutter.phone,
  },
  name: { fontSize: 18 },
  about: { marginLeft: 'auto' },
});
