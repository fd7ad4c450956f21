import type { Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { Link } from '@/components/ui/link';
import { Heading } from '@/components/ui/text';
import { touch } from '@/components/ui/tokens';

export interface SectionHeadProps {
  name: string;
  /** The way to the page where all of it stands. */
  link?: string;
  href?: Href;
}

/** The name of a part of Home, and the way to the whole of it. */
export function SectionHead({ name, link, href }: SectionHeadProps) {
  return (
    <View style={styles.head}>
      <Heading level={2}>{name}</Heading>
      {link && href ? (
        <Link href={href} aria-label={`${link}, ${name}`}>
          {link}
        </Link>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', minHeight: touch },
});
