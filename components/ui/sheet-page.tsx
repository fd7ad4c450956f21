import type { PropsWithChildren, ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { Heading, Text } from './text';
import { useTheme } from './theme';
import { gutter, line } from './tokens';
import { useLayout } from './use-layout';

export interface SheetPageProps {
  /** Stands in the phone's top bar instead there. */
  title: string;
  sub?: string;
  /** At the right of the head, and on a phone at the foot where `footed`. */
  actions?: ReactNode;
  footed?: boolean;
}

/** One sheet from edge to edge: its head with the actions, a rule, and columns under it. */
export function SheetPage({ title, sub, actions, footed = false, children }: PropsWithChildren<SheetPageProps>) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const paper = { backgroundColor: colors.paper };
  return (
    <View style={styles.page}>
      <ScrollView style={[styles.scroll, paper]} contentContainerStyle={styles.content}>
        {phone ? null : (
          <View style={[styles.head, { borderBottomColor: colors.rule2 }]}>
            <View style={styles.title}>
              <Heading level={1}>{title}</Heading>
              {sub ? (
                <Text step="note" tone="ink2">
                  {sub}
                </Text>
              ) : null}
            </View>
            {actions}
          </View>
        )}
        {children}
      </ScrollView>
      {phone && footed ? <View style={[styles.foot, paper, { borderTopColor: colors.ink }]}>{actions}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0 },
  scroll: { flex: 1 },
  content: { flexGrow: 1 },
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: 72,
    gap: 10,
    paddingHorizontal: gutter.wide,
    paddingVertical: 10,
    borderBottomWidth: 1,
  },
  title: { flex: 1, gap: 2 },
  foot: { flexDirection: 'row', gap: 8, padding: gutter.phone, borderTopWidth: line.head },
});
