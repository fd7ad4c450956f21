import { useState } from 'react';
import type { Gain } from '../draft/gain';
import type { GainMarks } from '../over/gain-marks';
import { BenchGainRule } from './bench-gain-rule';
import { GainKeypad } from './gain-keypad';
import { NudgeRow } from './nudge-row';
import { useGain } from './use-gain';

/** The gain that is moved on a phone: its rule, its nudges, and the keypad that enters it. */
export function ActiveGain({ gain, marks }: { gain: Gain; marks: GainMarks | undefined }) {
  const [entering, setEntering] = useState(false);
  const control = useGain(gain);
  return (
    <>
      <BenchGainRule key={gain} gain={gain} control={control} marks={marks} />
      <NudgeRow gain={gain} control={control} onEnter={() => setEntering(true)} />
      <GainKeypad gain={gain} control={control} open={entering} onClose={() => setEntering(false)} />
    </>
  );
}
