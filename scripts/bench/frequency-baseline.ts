import type { LoopModel, Rational } from '@/analysis';
import { expandRoots } from '@/analysis/numbers/polynomial';

/** Columns of the contract's frequency response beside the frequencies themselves. */
const COLUMNS = 12;

/**
 * The least that any program does for the curves of one loop: every polynomial by Horner's rule at every frequency of the
 * grid that the analysis returned, into arrays made beforehand; magnitudes, phases (wrapped), S and T from them.
 *
 * @param model without dead time
 * @returns what does it once; its number only keeps the work from being left out
 */
export function frequencyBaseline(model: LoopModel, frequencies: readonly number[]): () => number {
  const omegas = Float64Array.from(frequencies);
  const columns = Array.from({ length: COLUMNS }, () => new Float64Array(omegas.length));
  const plant = polynomialsOf([model.plant]);
  const command = polynomialsOf([model.controller, model.filters]);
  const sensor = polynomialsOf([model.sensor]);
  const [p, c, h] = [new Float64Array(2), new Float64Array(2), new Float64Array(2)];
  return () => {
    for (let i = 0; i < omegas.length; i += 1) {
      const omega = omegas[i];
      evaluate(plant, omega, p);
      evaluate(command, omega, c);
      evaluate(sensor, omega, h);
      const re = p[0] * c[0] - p[1] * c[1];
      const im = p[0] * c[1] + p[1] * c[0];
      const loopRe = re * h[0] - im * h[1];
      const loopIm = re * h[1] + im * h[0];
      const plantSize = Math.sqrt(p[0] * p[0] + p[1] * p[1]);
      const commandSize = Math.sqrt(c[0] * c[0] + c[1] * c[1]);
      const size = Math.sqrt(loopRe * loopRe + loopIm * loopIm);
      const distance = Math.sqrt((1 + loopRe) * (1 + loopRe) + loopIm * loopIm);
      columns[0][i] = size;
      columns[1][i] = Math.atan2(loopIm, loopRe);
      columns[2][i] = loopRe;
      columns[3][i] = loopIm;
      columns[4][i] = plantSize;
      columns[5][i] = Math.atan2(p[1], p[0]);
      columns[6][i] = commandSize;
      columns[7][i] = Math.atan2(c[1], c[0]);
      columns[8][i] = 1 / distance;
      columns[9][i] = size / distance;
      columns[10][i] = plantSize / distance;
      columns[11][i] = commandSize / distance;
    }
    return columns[COLUMNS - 1][0];
  };
}

interface Polynomials {
  readonly top: Float64Array;
  readonly bottom: Float64Array;
}

function polynomialsOf(parts: readonly Rational[]): Polynomials {
  const gain = parts.reduce((product, part) => product * part.gain, 1);
  return {
    top: Float64Array.from(expandRoots(parts.flatMap(({ zeros }) => zeros)), (c) => c * gain),
    bottom: Float64Array.from(expandRoots(parts.flatMap(({ poles }) => poles))),
  };
}

/** top/bottom at jω into `value`. */
function evaluate({ top, bottom }: Polynomials, omega: number, value: Float64Array): void {
  let [topRe, topIm] = [0, 0];
  for (let k = 0; k < top.length; k += 1) {
    const re = top[k] - topIm * omega;
    topIm = topRe * omega;
    topRe = re;
  }
  let [bottomRe, bottomIm] = [0, 0];
  for (let k = 0; k < bottom.length; k += 1) {
    const re = bottom[k] - bottomIm * omega;
    bottomIm = bottomRe * omega;
    bottomRe = re;
  }
  const square = bottomRe * bottomRe + bottomIm * bottomIm;
  value[0] = (topRe * bottomRe + topIm * bottomIm) / square;
  value[1] = (topIm * bottomRe - topRe * bottomIm) / square;
}
