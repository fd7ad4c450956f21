import { View } from 'react-native';
import { Link } from '@/components/ui/link';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useMe } from '@/hooks/queries/me';
import { keyList } from '../bench-keys';

/** The keys of the bench. Single letters work while the bench has the focus and no field has it. */
export function KeyList() {
  const { colors } = useTheme();
  const on = useMe().preferences.singleKeys;
  return (
    <View style={{ gap: 4 }}>
      <Heading level={3}>Keys</Heading>
      <Text step="note" tone="ink2">
        {on ? 'Single letters work while the bench has the focus and no field has it.' : 'Single letters are switched off.'}
      </Text>
      <View role="list">
        {keyList.map(({ keys, does }, i) => (
          <View
            key={keys}
            role="listitem"
            style={{
              flexDirection: 'row',
              gap: 12,
              paddingVertical: 6,
              paddingHorizontal: 6,
              backgroundColor: i % 2 ? undefined : colors.bar,
            }}
          >
            <Text step="note" weight={600} style={{ width: 200 }}>
              {keys}
            </Text>
            <Text step="note" tone="ink2" style={{ flex: 1 }}>
              {does}
            </Text>
          </View>
        ))}
      </View>
      <Link href="/account">Switch single letters on or off</Link>
    </View>
  );
}
