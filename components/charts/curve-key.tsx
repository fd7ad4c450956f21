import { memo } from 'react';
import { View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

const LENGTH = 28;

/** A piece of A's or B's line, to name it by. */
export function CurveSwatch({ design }: { design: 'a' | 'b' }) {
  const { colors } = useTheme();
  const pen = design === 'a' ? { stroke: colors.ink, strokeWidth: 2.25 } : { stroke: colors.b, strokeWidth: 2, strokeDasharray: '7 4' };
  return (
    <svg width={LENGTH} height={8} aria-hidden>
      <path d={`M0 4H${LENGTH}`} fill="none" {...pen} />
    </svg>
  );
}

/** The key line above a chart: which curve is which. */
export const CurveKey = memo(function CurveKey({ a, b }: { a: string; b?: string }) {
  const entries = [{ design: 'a' as const, label: a }, ...(b === undefined ? [] : [{ design: 'b' as const, label: b }])];
  return (
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: 20, rowGap: 4 }}>
      {entries.map(({ design, label }) => (
        <View key={design} style={{ flexDirection: 'row', alignItems: 'center', gap: 4 }}>
          <CurveSwatch design={design} />
          <Text step="small" tone={design === 'a' ? 'ink2' : 'b'}>
            {label}
          </Text>
        </View>
      ))}
    </View>
  );
});
