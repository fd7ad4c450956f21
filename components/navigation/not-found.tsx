import { usePathname } from 'expo-router';
import { View } from 'react-native';
import { BrandMark } from '@/components/ui/brand-mark';
import { DocumentTitle } from '@/components/ui/document-title';
import { Link } from '@/components/ui/link';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

/** The answer to an address that leads nowhere. */
export function NotFound() {
  const { colors } = useTheme();
  return (
    <View role="main" style={{ flex: 1, backgroundColor: colors.paper, padding: 26, gap: 12, alignItems: 'flex-start' }}>
      <DocumentTitle parts={['Not here']} />
      <BrandMark size={32} />
      <Heading level={1}>Not here</Heading>
      <Text tone="ink2">There is no page at {usePathname()}.</Text>
      <Link href="/">All projects</Link>
    </View>
  );
}
