import type { PropsWithChildren, ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { Heading, Text } from './text';
import { useTheme } from './theme';
import { gutter, line } from './tokens';
import { useLayout } from './use-layout';

export interface PageProps {
  /** Names a page on which nothing may take the keyboard: it is then scrolled by keys as a whole. */
  scrolledAs?: string;
  /** Left out where the phone's top bar already says it. */
  title?: string;
  sub?: string;
  actions?: ReactNode;
  /** A narrower column for text. */
  width?: number;
  /** What a phone keeps at its foot, in reach of a thumb. */
  foot?: ReactNode;
}

/** One scrolling page on the desk: its title and actions, then sheets. On a phone the sheet fills the page. */
export function Page({ scrolledAs, title, sub, actions, width = 1240, foot, children }: PropsWithChildren<PageProps>) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const page = (
    <ScrollView
      style={[styles.scroll, { backgroundColor: colors.desk }]}
      contentContainerStyle={styles.content}
      {...(scrolledAs && { tabIndex: 0, role: 'region', 'aria-label': scrolledAs })}
    >
      <View style={[styles.column, { maxWidth: width + 2 * gutter.wide }, phone ? styles.phone : styles.wide]}>
        {title && !phone ? (
          <View style={styles.head}>
            <View style={styles.title}>
              <Heading level={1}>{title}</Heading>
              {sub ? (
                <Text step="note" tone="ink2">
                  {sub}
                </Text>
              ) : null}
            </View>
            <View style={styles.actions}>{actions}</View>
          </View>
        ) : null}
        {children}
      </View>
    </ScrollView>
  );
  if (!phone || !foot) return page;
  return (
    <View style={styles.page}>
      {page}
      <View style={[styles.foot, { backgroundColor: colors.paper, borderTopColor: colors.ink }]}>{foot}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0 },
  foot: { flexDirection: 'row', gap: 8, paddingHorizontal: gutter.phone, paddingVertical: 8, borderTopWidth: line.head, zIndex: 1 },
  scroll: { flex: 1 },
  content: { flexGrow: 1, alignItems: 'center' },
  column: { width: '100%' },
  wide: { paddingHorizontal: gutter.wide, paddingTop: 20, paddingBottom: 40, gap: 14 },
  phone: { flexGrow: 1, paddingBottom: 20, gap: 8 },
  // The lists that drop out of its menus lie over the page.
  head: { flexDirection: 'row', alignItems: 'center', minHeight: 52, gap: 16, zIndex: 2 },
  title: { flex: 1, gap: 2 },
  actions: { flexDirection: 'row', alignItems: 'center', gap: 10 },
});
