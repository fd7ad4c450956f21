import { useEffect, useState } from 'react';
import { engines } from '../engine/engines';
import { loopAnswer, type LoopAnswer } from './loop-answer';

/** An answer with responses that last until `end` s. Until the engine has made them, what was made before. */
export function useLonger(from: LoopAnswer | null, end: number | null): LoopAnswer | null {
  const [made, setMade] = useState<LoopAnswer | null>(null);
  useEffect(() => {
    if (from === null || end === null) return;
    let wanted = true;
    const { loop, analysis } = from;
    const { frequencyResponse, ...numbers } = analysis;
    void engines()
      .responses.run('lengthen', { loop, analysis: numbers, end })
      .then((longer) => {
        if (wanted) setMade(loopAnswer(loop, { ...longer, frequencyResponse }));
      });
    return () => {
      wanted = false;
    };
  }, [from, end]);
  return from === null ? null : (made ?? from);
}
