import { memo, useId } from 'react';
import { Circle, ClipPath, Defs, G, Path } from 'react-native-svg';
import { useTheme } from '@/components/ui/theme';
import type { CircleKerb, ClosedKerb, Point, StraightKerb } from '@/figures';

const EDGE = 1.5;
const OUTLINE = 0.75;

/** Kerb along a straight limit: the line is the limit, the blocks lie beyond it. */
export const KerbStripe = memo(function KerbStripe({ kerb }: { kerb: StraightKerb }) {
  const { colors } = useTheme();
  return (
    <G>
      <Path d={kerb.ground} fill={colors.kerbGap} stroke={colors.kerb} strokeWidth={OUTLINE} />
      <Path d={kerb.blocks} fill={colors.kerb} />
      <Path d={kerb.edge} fill="none" stroke={colors.kerb} strokeWidth={EDGE} />
    </G>
  );
});

/** Kerb round a circular limit, blocks inside. */
export const KerbCircle = memo(function KerbCircle({ center, circle }: { center: Point; circle: CircleKerb }) {
  const { colors } = useTheme();
  const ring = { cx: center.x, cy: center.y, fill: 'none' };
  return (
    <G>
      <Circle {...ring} r={circle.middle} stroke={colors.kerbGap} strokeWidth={circle.width} />
      <Circle {...ring} r={circle.middle} stroke={colors.kerb} strokeWidth={circle.width} strokeDasharray={[circle.dash, circle.dash]} />
      <Circle {...ring} r={circle.inner} stroke={colors.kerb} strokeWidth={OUTLINE} />
      <Circle {...ring} r={circle.middle + circle.width / 2} stroke={colors.kerb} strokeWidth={EDGE} />
    </G>
  );
});

/** Kerb inside any closed limit: twice its thickness, cut to the forbidden side. */
export const KerbOutline = memo(function KerbOutline({ kerb }: { kerb: ClosedKerb }) {
  const { colors } = useTheme();
  const id = useId();
  const stripe = { d: kerb.outline, fill: 'none', strokeWidth: kerb.strokeWidth };
  return (
    <G>
      <Defs>
        <ClipPath id={id}>
          <Path d={kerb.outline} />
        </ClipPath>
      </Defs>
      <G clipPath={`url(#${id})`}>
        <Path {...stripe} stroke={colors.kerbGap} />
        <Path {...stripe} stroke={colors.kerb} strokeDasharray={[kerb.dash, kerb.dash]} />
      </G>
      <Path d={kerb.outline} fill="none" stroke={colors.kerb} strokeWidth={EDGE} />
    </G>
  );
});
