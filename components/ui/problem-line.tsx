import { View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';

/** What the server had against something, with the bar of an error; read out when it appears. */
export function ProblemLine({ text }: { text?: string | null | false }) {
  const { colors } = useTheme();
  if (!text) return null;
  return (
    <View role="alert" style={{ borderLeftWidth: 4, borderLeftColor: colors.fail, paddingLeft: 8 }}>
      <Text step="note" tone="fail">
        {text}
      </Text>
    </View>
  );
}
