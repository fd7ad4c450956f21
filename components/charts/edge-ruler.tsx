import { memo, useMemo } from 'react';
import { View } from 'react-native';
import { useTheme } from '@/components/ui/theme';
import { edgeRuler, type EdgeRulerShape } from '@/figures/edge-ruler';
import { round2 } from '@/figures/geometry';
import { textWidth } from '@/figures/text-width';
import { ChartText } from './chart-text';
import { KerbStripe } from './kerb-stripe';
import { useChartFrame } from './use-chart-frame';

export interface EdgeRulerProps {
  /** `use` of every case: 0 at the target, 1 at the limit. */
  uses: readonly number[];
  worst: number | null;
  hasTarget: boolean;
  /** Says in words what the ruler shows. */
  label: string;
  /** Under the line, for a ruler that stands alone. */
  names?: { limit: string; target?: string };
  /** Design B's worst, and its name where there is room. */
  ghost?: { use: number; name?: string };
  width?: number;
}

const HEIGHT = { plain: 30, named: 50 };
const GHOST_NAME_FROM = 60;

function Line({ shape: { baseline, target, limit, hasTarget } }: { shape: EdgeRulerShape }) {
  const { colors } = useTheme();
  const { y, from, to } = baseline;
  return (
    <g>
      <path d={`M${from} ${y}H${round2(to)}`} stroke={colors.rule2} strokeWidth={1} />
      {hasTarget ? (
        <>
          <path d={`M${round2(target)} ${y}H${round2(limit)}`} stroke={colors.tight} strokeWidth={3} />
          <path d={`M${round2(target)} ${y - 9}V${y + 6}`} stroke={colors.tight} strokeWidth={1.5} />
        </>
      ) : null}
      <path d={`M${round2(limit)} ${y - 9}V${y + 8}`} stroke={colors.kerb} strokeWidth={1.5} />
    </g>
  );
}

function Cases({ shape: { baseline, ticks, needle, ghost, offLeft, offRight }, width }: { shape: EdgeRulerShape; width: number }) {
  const { colors } = useTheme();
  const { y } = baseline;
  const marks = ticks.map((x) => `M${round2(x)} ${y - 8}v8`).join('');
  return (
    <g>
      <path d={marks} stroke={colors.ink2} strokeWidth={1} strokeOpacity={0.75} />
      {offLeft ? <path d={`M9 ${y - 5}L3 ${y}l6 5`} fill="none" stroke={colors.ink2} strokeWidth={1.5} /> : null}
      {offRight ? <path d={`M${width - 7} ${y - 6}l6 6.5l-6 6.5z`} fill={colors.fail} /> : null}
      {ghost === null ? null : <path d={`M${round2(ghost)} ${y}v-12`} stroke={colors.b} strokeWidth={2} strokeDasharray="3 2" />}
      {needle === null ? null : (
        <>
          <path d={`M${round2(needle)} ${y}v-12`} stroke={colors.ink} strokeWidth={2.5} />
          <path d={`M${round2(needle - 5)} ${y - 19}h10l-5 8z`} fill={colors.ink} />
        </>
      )}
    </g>
  );
}

/** All cases against one target and limit: left is comfortable, the edge is on the right, the needle is the worst. */
export const EdgeRuler = memo(function EdgeRuler({ uses, worst, hasTarget, label, names, ghost, width: fixed }: EdgeRulerProps) {
  const { width, onLayout } = useChartFrame(fixed);
  const height = names === undefined ? HEIGHT.plain : HEIGHT.named;
  const ghostUse = ghost?.use ?? null;
  const named = names !== undefined;
  const shape = useMemo(
    () => edgeRuler({ width, height, uses, worst, hasTarget, ghost: ghostUse, named }),
    [width, height, uses, worst, hasTarget, ghostUse, named],
  );
  const { y } = shape.baseline;
  const limitAt = Math.min(shape.limit + 2, width - textWidth(names?.limit ?? '') / 2);
  return (
    <View role="img" aria-label={label} onLayout={onLayout} style={{ height }}>
      {width > 0 ? (
        <svg width={width} height={height} aria-hidden>
          <KerbStripe kerb={shape.kerb} />
          <Line shape={shape} />
          <Cases shape={shape} width={width} />
          {names === undefined ? null : (
            <ChartText x={limitAt} y={y + 21} tone="limit" anchor="middle">
              {names.limit}
            </ChartText>
          )}
          {names?.target === undefined || !hasTarget ? null : (
            <ChartText x={shape.target - 4} y={y + 21} anchor="end">
              {names.target}
            </ChartText>
          )}
          {ghost?.name === undefined || shape.ghost === null || shape.ghost < GHOST_NAME_FROM ? null : (
            <ChartText x={shape.ghost} y={y - 15} anchor="middle" tone="b" halo>
              {ghost.name}
            </ChartText>
          )}
        </svg>
      ) : null}
    </View>
  );
});
