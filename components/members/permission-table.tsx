import { StyleSheet, View } from 'react-native';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import type { Role } from '@/contract';
import { allows, type Permission, permissions } from '@/contract/permissions';

const roles: readonly Role[] = ['owner', 'editor', 'reviewer', 'viewer'];
const rows = Object.keys(permissions) as Permission[];

/** Who may do what: the very table that the server asks. */
export function PermissionTable({ own }: { own: Role }) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const column = phone ? styles.narrow : styles.column;
  return (
    <View style={{ gap: 8 }}>
      <Heading level={2}>Who may do what</Heading>
      <View role="table" aria-label="Who may do what">
        <View role="row" style={[styles.row, styles.head, { borderBottomColor: colors.ink }]}>
          {phone ? null : <View role="cell" style={styles.words} />}
          {roles.map((role) => (
            <View key={role} role="columnheader" style={column}>
              <Text step={role === own ? 'h3' : 'note'} tone={role === own ? 'ink' : 'ink2'}>
                {role}
              </Text>
            </View>
          ))}
        </View>
        {rows.map((permission, index) => (
          <View
            key={permission}
            role="row"
            style={[styles.row, phone && styles.stacked, { backgroundColor: index % 2 === 0 ? colors.bar : colors.paper }]}
          >
            <View role="rowheader" style={phone ? styles.whole : styles.words}>
              <Text step="note">{permissions[permission].words}</Text>
            </View>
            {roles.map((role) => (
              <View key={role} role="cell" aria-label={allows(role, permission) ? 'may' : 'may not'} style={column}>
                <Mark may={allows(role, permission)} />
              </View>
            ))}
          </View>
        ))}
      </View>
    </View>
  );
}

function Mark({ may }: { may: boolean }) {
  const { colors } = useTheme();
  return may ? <View style={[styles.dot, { backgroundColor: colors.ink }]} /> : <Text tone="ink3">–</Text>;
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 44, paddingHorizontal: 8, paddingVertical: 6 },
  head: { borderBottomWidth: line.head, minHeight: 40, paddingVertical: 0 },
  stacked: { flexWrap: 'wrap', rowGap: 6 },
  words: { flex: 1, minWidth: 0, paddingRight: 12 },
  whole: { width: '100%' },
  column: { width: 76, alignItems: 'center' },
  narrow: { flex: 1, flexBasis: 60, alignItems: 'center' },
  dot: { width: 10, height: 10, borderRadius: 5 },
});
