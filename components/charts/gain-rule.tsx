import { memo, useId, useMemo } from 'react';
import { View, type ViewStyle } from 'react-native';
import {
  formatGain,
  gainMode,
  gainRule,
  type GainScaleInput,
  gainScale,
  type GainStretch,
  linearSpanOf,
  nudgedGain,
  ruleRows,
  type UnstableGains,
  withUnit,
} from '@/figures';
import { HiddenText } from '@/components/ui/hidden-text';
import { describeRule } from './describe-rule';
import { GainRuleView } from './gain-rule-view';
import { useChartFrame } from './use-chart-frame';
import { useFocusRing } from './use-focus-ring';
import { type GainChange, useGainDrag } from './use-gain-drag';

export interface GainRuleProps {
  name: string;
  unit?: string;
  value: number;
  /** The value that was kept last, or null. */
  kept?: number | null;
  /** Factor from end to end: `gainSpans.phone` or `gainSpans.wide`. */
  span: number;
  /** End to end of a linear rule where the gain and the kept one are 0. */
  zeroSpan?: number;
  /** Where around this value the limits hold. Absent: nobody looked, and nothing is claimed. */
  stretch?: GainStretch;
  unstable?: UnstableGains;
  /** Moves come at the screen's rate; "end" once, when the finger lifts or a key was pressed. */
  onChange: GainChange;
  disabled?: boolean;
  width?: number;
}

const directions: Record<string, number> = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 };
const NUDGE = { plain: 0.01, coarse: 0.1, fine: 0.001 };
const DEFAULT_ZERO_SPAN = 1;
const sideways = { touchAction: 'pan-y', cursor: 'ew-resize', userSelect: 'none' } as unknown as ViewStyle;

/** The scale for a value, or while it is dragged the kind of scale that the drag began with. */
function scaleFor({ value, kept = null, span, zeroSpan = DEFAULT_ZERO_SPAN }: GainRuleProps, width: number): GainScaleInput {
  return { value, width, span, mode: gainMode(value, kept), linearSpan: linearSpanOf(value, kept, zeroSpan) };
}

/** A gain as a slide rule under a fixed needle: drag it, with two fingers for a tenth; arrow keys 1 %, with Shift 10 %, with Alt 0.1 %. */
export const GainRule = memo(function GainRule(props: GainRuleProps) {
  const { name, unit = '', value, kept = null, stretch, unstable, onChange, disabled = false } = props;
  const { width, onLayout } = useChartFrame(props.width);
  const { style, ...focus } = useFocusRing();
  const resting = scaleFor(props, width);
  const { dragged, handlers } = useGainDrag(resting, onChange);
  const { mode, linearSpan } = dragged ?? resting;
  const { span } = props;
  const scale = useMemo(() => ({ value, width, span, mode, linearSpan }), [value, width, span, mode, linearSpan]);
  const shape = useMemo(
    () => (width > 0 ? gainRule({ ...scale, kept, stretch, unstable }) : null),
    [scale, width, kept, stretch, unstable],
  );
  const [least, most] = gainScale(scale).domain;
  const press = (event: KeyboardEvent) => {
    const direction = directions[event.key];
    if (direction === undefined) return;
    event.preventDefault();
    const size = event.shiftKey ? NUDGE.coarse : event.altKey ? NUDGE.fine : NUDGE.plain;
    onChange(nudgedGain(scale, direction * size), 'end');
  };
  const marks = describeRule(stretch, unstable);
  const marksId = useId();
  return (
    <View>
      <View
        role="slider"
        tabIndex={disabled ? -1 : 0}
        aria-label={name}
        aria-disabled={disabled || undefined}
        aria-valuemin={least}
        aria-valuemax={most}
        aria-valuenow={value}
        aria-valuetext={withUnit(formatGain(value), unit)}
        aria-describedby={marks === '' ? undefined : marksId}
        onLayout={onLayout}
        onKeyDown={disabled ? undefined : press}
        {...(disabled ? {} : handlers)}
        {...focus}
        style={[{ height: ruleRows.height }, sideways, style]}
      >
        {shape === null ? null : (
          <svg width={width} height={ruleRows.height} aria-hidden>
            <GainRuleView shape={shape} width={width} moving={dragged !== null} />
          </svg>
        )}
      </View>
      <HiddenText id={marksId}>{marks}</HiddenText>
    </View>
  );
});
