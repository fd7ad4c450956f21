import { useCallback, useMemo } from 'react';
import { GainRule } from '@/components/charts';
import { gainSpans } from '@/figures';
import { type Gain, gainWords } from '../draft/gain';
import { type GainMarks, ruleMarks } from '../over/gain-marks';
import { IntegralOff } from './integral-off';
import type { GainControl } from './use-gain';

interface BenchGainRuleProps {
  gain: Gain;
  control: GainControl;
  marks: GainMarks | undefined;
  wide?: boolean;
}

/** The rule of one gain: dragging it moves the draft, lifting the finger ends the step. Without integral action Ti has none. */
export function BenchGainRule({ gain, control, marks, wide = false }: BenchGainRuleProps) {
  const { hold, release } = control;
  const change = useCallback(
    (value: number, phase: 'move' | 'end') => {
      hold(value);
      if (phase === 'end') release();
    },
    [hold, release],
  );
  const { stretch, unstable } = useMemo(() => ruleMarks(marks ?? {}), [marks]);
  const { label, name } = gainWords(gain, control.form);
  if (control.value === null) return <IntegralOff />;
  return (
    <GainRule
      name={`${label}, ${name}`}
      unit={control.unit}
      value={control.value}
      kept={control.kept}
      span={wide ? gainSpans.wide : gainSpans.phone}
      stretch={stretch}
      unstable={unstable}
      onChange={change}
    />
  );
}
