import type { ProblemDetails } from '@/contract';

/** The server answered, and the answer is no. `message` is the sentence to show; `at(pointer)` what it says of one field. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly details: ProblemDetails;

  constructor(details: ProblemDetails) {
    super(details.detail || details.title);
    this.name = 'ApiProblem';
    this.status = details.status;
    this.details = details;
  }

  at(pointer: string): string | undefined {
    return this.details.errors?.find((error) => error.pointer === pointer)?.detail;
  }
}

/** Nobody answered: no network, or no server at its end. */
export class NoSignal extends Error {
  constructor() {
    super('No signal. Nothing was sent or kept.');
    this.name = 'NoSignal';
  }
}

/** The sentence that a screen shows for whatever went wrong. */
export const sentence = (error: unknown): string => (error instanceof Error ? error.message : 'It did not work. Try again.');

export const hasStatus = (error: unknown, status: number): boolean => error instanceof ApiProblem && error.status === status;
