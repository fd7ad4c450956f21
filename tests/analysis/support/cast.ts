import { analyseLoop, buildLoop } from '@/analysis';
import { ContinuousLoop } from '@/analysis/margins/continuous-loop';
import { loopNumbers } from '@/analysis/margins/loop-numbers';
import { judgeStability } from '@/analysis/margins/stability';
import { Loop, type Analysis, type LoopInput } from '@/contract';

type Plant = LoopInput['plant'];
type Controller = LoopInput['controller'];

export const coefficients = (numerator: number[], denominator: number[], deadTime = 0): Plant => ({
  kind: 'coefficients',
  numerator,
  denominator,
  deadTime,
});

export const roots = (
  gain: number,
  { zeros = [], poles = [] }: { zeros?: [number, number][]; poles?: [number, number][] },
  deadTime = 0,
): Plant => {
  const complex = (list: [number, number][]) =>
    list.flatMap(([re, im]) =>
      im === 0
        ? [{ re, im }]
        : [
            { re, im },
            { re, im: -im },
          ],
    );
  return { kind: 'roots', gain, zeros: complex(zeros), poles: complex(poles), deadTime };
};

export const pid = (kp: number, ki = 0, kd = 0, derivativeFilterTime = 0): Controller => ({
  form: 'parallel',
  kp,
  ki,
  kd,
  derivativeFilterTime,
});

/** A loop with defaults filled in. */
export const loopOf = (plant: Plant, controller: Controller = pid(1), rest: Partial<LoopInput> = {}): Loop =>
  Loop.parse({ plant, controller, ...rest });

/** The numbers alone: no curves. */
export const numbersOf = (plant: Plant, controller: Controller = pid(1), rest: Partial<LoopInput> = {}): Analysis =>
  analyseLoop(loopOf(plant, controller, rest), { curves: false });

/** What the frequency axis says, without time responses: for properties that ask hundreds of loops. */
export const frequencyNumbersOf = (plant: Plant, controller: Controller = pid(1), detail: 'full' | 'live' = 'full') => {
  const model = buildLoop(loopOf(plant, controller));
  const loop = new ContinuousLoop(model);
  const numbers = loopNumbers(loop, detail);
  const closedLoop = judgeStability(model, loop, { ...numbers, modulus: numbers.margins.modulus });
  return { ...numbers, closedLoop, evaluations: loop.evaluations };
};
