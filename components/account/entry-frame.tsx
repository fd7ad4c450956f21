import type { PropsWithChildren } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';
import { BrandMark } from '@/components/ui/brand-mark';
import { DocumentTitle } from '@/components/ui/document-title';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { EntryPicture } from './entry-picture';

export interface EntryFrameProps {
  /** What the page is for; the sign-in page has the product's question instead. */
  title: string;
  lead: string;
}

/** The pages before the gate: what one does here at the left, a loop and its edge at the right, above it on a phone. */
export function EntryFrame({ title, lead, children }: PropsWithChildren<EntryFrameProps>) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const border = { borderColor: colors.ink };
  return (
    <View style={[styles.page, phone ? styles.column : styles.row, { backgroundColor: colors.paper }]}>
      <DocumentTitle parts={[title]} />
      {phone && (
        <View style={[styles.band, border]}>
          <EntryPicture view="near" />
        </View>
      )}
      <ScrollView
        role="main"
        style={phone ? styles.phoneSide : [styles.side, border]}
        contentContainerStyle={phone ? styles.phone : styles.wide}
      >
        <View style={styles.brand}>
          <BrandMark size={32} />
          <Text step="h1" weight={700} style={styles.name}>
            Kerbline
          </Text>
        </View>
        <Heading level={1} step="h2" tone="ink2" weight={500} style={styles.lead}>
          {lead}
        </Heading>
        {children}
      </ScrollView>
      {!phone && (
        <View style={styles.picture}>
          <EntryPicture />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0 },
  row: { flexDirection: 'row' },
  column: { flexDirection: 'column' },
  band: { height: 150, overflow: 'hidden', borderBottomWidth: line.head },
  picture: { flex: 1, overflow: 'hidden' },
  side: { flexGrow: 0, flexBasis: 520, flexShrink: 1, minWidth: 380, borderRightWidth: line.head },
  phoneSide: { flex: 1 },
  wide: { paddingHorizontal: '15%', paddingVertical: 120, gap: 14 },
  phone: { padding: 20, gap: 14 },
  brand: { flexDirection: 'row', alignItems: 'center', gap: 10 },
  name: { fontSize: 26 },
  lead: { fontSize: 22, lineHeight: 29, marginBottom: 8 },
});
