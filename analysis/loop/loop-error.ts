export type LoopErrorCode =
  'zeroPlant' | 'improperPlant' | 'missingConjugate' | 'unsupported' | 'singularLoop' | 'outOfRange' | 'tooMuchToCompute' | 'formula';

/**
 * A loop that has no meaning, or that would take too long to compute.
 * `pointer` is a JSON Pointer into the Loop (`/plant/denominator`), `detail` a sentence for the person who entered it.
 */
export class LoopError extends Error {
  readonly pointer: string;
  readonly detail: string;
  readonly code: LoopErrorCode;

  constructor({ pointer, detail, code }: { pointer: string; detail: string; code: LoopErrorCode }) {
    super(`${pointer}: ${detail}`);
    this.name = 'LoopError';
    this.pointer = pointer;
    this.detail = detail;
    this.code = code;
  }
}
