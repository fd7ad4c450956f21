export interface AnswerOptions {
  /** Other than the route's own, as 202 for a job. */
  readonly status?: number;
  readonly etag?: string;
  readonly headers?: Readonly<Record<string, string | string[]>>;
}

/** A handler's answer where the body alone does not say it all. */
export class Answer<Body> {
  constructor(
    readonly body: Body,
    readonly options: AnswerOptions = {},
  ) {}
}

/** @example return answer(project, { etag: etagOf(project.version) }) */
export const answer = <Body>(body: Body, options?: AnswerOptions) => new Answer(body, options);
