import { memo, useId } from 'react';
import { useTheme } from '@/components/ui/theme';
import type { CircleKerb, ClosedKerb, Point, StraightKerb } from '@/figures';

const EDGE = 1.5;
const OUTLINE = 0.75;

/** Kerb along a straight limit: the line is the limit, the blocks lie beyond it. */
export const KerbStripe = memo(function KerbStripe({ kerb }: { kerb: StraightKerb }) {
  const { colors } = useTheme();
  return (
    <g>
      <path d={kerb.ground} fill={colors.kerbGap} stroke={colors.kerb} strokeWidth={OUTLINE} />
      <path d={kerb.blocks} fill={colors.kerb} />
      <path d={kerb.edge} fill="none" stroke={colors.kerb} strokeWidth={EDGE} />
    </g>
  );
});

/** Kerb round a circular limit, blocks inside. */
export const KerbCircle = memo(function KerbCircle({ center, circle }: { center: Point; circle: CircleKerb }) {
  const { colors } = useTheme();
  const ring = { cx: center.x, cy: center.y, fill: 'none' };
  return (
    <g>
      <circle {...ring} r={circle.middle} stroke={colors.kerbGap} strokeWidth={circle.width} />
      <circle {...ring} r={circle.middle} stroke={colors.kerb} strokeWidth={circle.width} strokeDasharray={circle.dash} />
      <circle {...ring} r={circle.inner} stroke={colors.kerb} strokeWidth={OUTLINE} />
      <circle {...ring} r={circle.middle + circle.width / 2} stroke={colors.kerb} strokeWidth={EDGE} />
    </g>
  );
});

/** Kerb inside any closed limit: twice its thickness, cut to the forbidden side. */
export const KerbOutline = memo(function KerbOutline({ kerb }: { kerb: ClosedKerb }) {
  const { colors } = useTheme();
  const id = useId();
  const stripe = { d: kerb.outline, fill: 'none', strokeWidth: kerb.strokeWidth };
  return (
    <g>
      <defs>
        <clipPath id={id}>
          <path d={kerb.outline} />
        </clipPath>
      </defs>
      <g clipPath={`url(#${id})`}>
        <path {...stripe} stroke={colors.kerbGap} />
        <path {...stripe} stroke={colors.kerb} strokeDasharray={kerb.dash} />
      </g>
      <path d={kerb.outline} fill="none" stroke={colors.kerb} strokeWidth={EDGE} />
    </g>
  );
});
