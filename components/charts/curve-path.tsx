import { memo } from 'react';
import { useTheme } from '@/components/ui/theme';

export type CurveKind = 'a' | 'b' | 'secondA' | 'secondB' | 'others';

const OTHERS_OPACITY = 0.42;

/** A curve: A solid, B dashed, a panel's second quantity thinner, other cases thin and faint. */
export const CurvePath = memo(function CurvePath({ d, kind }: { d: string; kind: CurveKind }) {
  const { colors } = useTheme();
  if (d === '') return null;
  const pens = {
    a: { stroke: colors.ink, strokeWidth: 2.25 },
    b: { stroke: colors.b, strokeWidth: 2, strokeDasharray: '7 4' },
    secondA: { stroke: colors.ink, strokeWidth: 1.5 },
    secondB: { stroke: colors.b, strokeWidth: 1.5, strokeDasharray: '3.5 3' },
    others: { stroke: colors.ink3, strokeWidth: 0.75, strokeOpacity: OTHERS_OPACITY },
  };
  return <path d={d} fill="none" strokeLinejoin="round" strokeLinecap={kind === 'a' ? 'round' : 'butt'} {...pens[kind]} />;
});
