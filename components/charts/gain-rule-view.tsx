import { memo } from 'react';
import { useTheme } from '@/components/ui/theme';
import { type GainRuleShape, round2, ruleRows, type RuleTick } from '@/figures';
import { ChartText } from './chart-text';
import { KerbStripe } from './kerb-stripe';

const FADED = 0.4;
const { baseline: Y, edge: EDGE_Y, warning: WARNING_Y } = ruleRows;

const tickPath = (ticks: readonly RuleTick[]): string => ticks.map(({ x, height }) => `M${round2(x)} ${Y}v${-height}`).join('');

function Scale({ shape: { ticks, labels }, width }: { shape: GainRuleShape; width: number }) {
  const { colors } = useTheme();
  return (
    <g>
      <path d={`M0 ${Y}H${width}${tickPath(ticks)}`} stroke={colors.rule2} strokeWidth={1} fill="none" />
      {labels.map(({ x, text, isZero }) => (
        <ChartText key={text} x={x} y={Y - 16} anchor="middle" tone={isZero ? 'strong' : 'tick'}>
          {text}
        </ChartText>
      ))}
    </g>
  );
}

function Limits({ shape: { held, edges, kerbs, warnings } }: { shape: GainRuleShape }) {
  const { colors } = useTheme();
  return (
    <g>
      {held === null ? null : <path d={`M${round2(held[0])} ${Y}H${round2(held[1])}`} stroke={colors.ink} strokeWidth={3} />}
      {kerbs.map(({ x, shape }) => (
        <g key={x}>
          <KerbStripe kerb={shape} />
          <path d={`M${round2(x)} ${Y - 14}V${Y + 9}`} stroke={colors.kerb} strokeWidth={1.5} />
        </g>
      ))}
      {edges.map(({ tick, x, text, anchor }) => (
        <g key={anchor}>
          <path d={`M${round2(tick)} ${Y - 14}V${Y + 10}`} stroke={colors.kerb} strokeWidth={1.5} />
          <ChartText x={x} y={EDGE_Y} anchor={anchor} tone="limit">
            {text}
          </ChartText>
        </g>
      ))}
      {warnings.map(({ x, text, anchor }) => (
        <ChartText key={anchor} x={x} y={WARNING_Y} anchor={anchor}>
          {text}
        </ChartText>
      ))}
    </g>
  );
}

export interface GainRuleViewProps {
  shape: GainRuleShape;
  width: number;
  /** While the finger moves, limits belong to the gain that was. */
  moving: boolean;
}

/** The drawing of a gain rule: sliding scale, limits, the kept value as a hollow triangle, the needle in the middle. */
export const GainRuleView = memo(function GainRuleView({ shape, width, moving }: GainRuleViewProps) {
  const { colors } = useTheme();
  const middle = width / 2;
  return (
    <g>
      <Scale shape={shape} width={width} />
      <g opacity={moving ? FADED : 1}>
        <Limits shape={shape} />
      </g>
      {shape.kept === null ? null : (
        <path d={`M${round2(shape.kept)} ${Y + 2}l-5 9h10z`} fill={colors.paper} stroke={colors.ink} strokeWidth={1.5} />
      )}
      <path d={`M${middle} 4V${Y + 2}`} stroke={colors.ink} strokeWidth={2.5} />
      <path d={`M${middle - 6} 2h12l-6 8z`} fill={colors.ink} />
    </g>
  );
});
