import { View } from 'react-native';
import type { Verdict } from '@/contract';
import { verdictWords } from '@/figures/verdict-shape';
import { Text } from './text';
import { VerdictGlyph } from './verdict-glyph';

/** The verdict in a line of text: shape and word. */
export function VerdictWord({ verdict, size = 18 }: { verdict: Verdict; size?: number }) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 6 }}>
      <VerdictGlyph verdict={verdict} size={size} />
      <Text tone={verdict} weight={600} numberOfLines={1}>
        {verdictWords[verdict]}
      </Text>
    </View>
  );
}
