import { View } from 'react-native';
import { useTheme } from '@/components/ui/theme';
import type { CaseBasis } from '@/contract';

const SIZES = { small: 6, plain: 8 };

/** A filled disc is measured, a half one comes from the car's figures, an open ring is extrapolated. Beside a word, or told by the legend. */
export function BasisMark({ basis, small = false }: { basis: CaseBasis; small?: boolean }) {
  const { colors } = useTheme();
  const size = small ? SIZES.small : SIZES.plain;
  const r = size / 2;
  return (
    <View style={{ width: size, height: size }}>
      <svg width={size} height={size} aria-hidden style={{ display: 'block' }}>
        {basis === 'measured' ? (
          <circle cx={r} cy={r} r={r} fill={colors.ink} />
        ) : (
          <circle cx={r} cy={r} r={r - 0.75} fill="none" stroke={colors.ink2} strokeWidth={1.25} />
        )}
        {basis === 'figures' ? <path d={`M${r} 0A${r} ${r} 0 0 0 ${r} ${size}Z`} fill={colors.ink2} /> : null}
      </svg>
    </View>
  );
}
