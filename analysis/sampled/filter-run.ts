import type { DigitalFilter } from './digital-filter';

/** One filter and the samples that it remembers, the latest first. */
export class FilterRun {
  private readonly inputs: number[];
  private readonly answers: number[];

  constructor(private readonly filter: DigitalFilter) {
    this.inputs = filter.back.map(() => 0);
    this.answers = filter.back.map(() => 0);
  }

  /** The answer to this input; nothing is remembered. */
  preview(input: number): number {
    const { forward, back } = this.filter;
    let answer = forward[0] * input;
    for (let i = 0; i < back.length; i += 1) answer += forward[i + 1] * this.inputs[i] - back[i] * this.answers[i];
    return answer;
  }

  step(input: number): number {
    const answer = this.preview(input);
    for (const [memory, latest] of [
      [this.inputs, input],
      [this.answers, answer],
    ] as const) {
      memory.pop();
      memory.unshift(latest);
    }
    return answer;
  }
}
