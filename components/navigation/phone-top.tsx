import { type Href, useRouter } from 'expo-router';
import type { PropsWithChildren } from 'react';
import { StyleSheet, View } from 'react-native';
import { IconButton } from '@/components/ui/icon-button';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

export interface PhoneTopProps {
  title: string;
  sub?: string;
  /** One step back; `up` is where that leads when the page was opened by its address. */
  up?: Href;
}

export function PhoneTop({ title, sub, up, children }: PropsWithChildren<PhoneTopProps>) {
  const { colors } = useTheme();
  const router = useRouter();
  const back = () => (router.canGoBack() ? router.back() : router.replace(up ?? '/'));
  return (
    <View role="banner" style={[styles.top, { backgroundColor: colors.paper }]}>
      {up ? <IconButton icon="back" label="Back" onPress={back} /> : <View style={styles.inset} />}
      <View style={styles.title}>
        <Heading level={1} step="h3" style={styles.name} numberOfLines={1}>
          {title}
        </Heading>
        {sub ? (
          <Text step="tick" tone="ink3" numberOfLines={1}>
            {sub}
          </Text>
        ) : null}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  top: { zIndex: 10, height: 52, flexDirection: 'row', alignItems: 'center', paddingHorizontal: 4, gap: 2 },
  inset: { width: 8 },
  title: { flex: 1, minWidth: 0 },
  name: { fontSize: 18 },
});
