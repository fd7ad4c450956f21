import { STATUS_CODES } from 'node:http';
import type { ProblemDetails, ProblemError } from '@/contract';

export interface ProblemOptions {
  /** What is wrong with which part of the body. */
  readonly errors?: readonly ProblemError[];
  readonly headers?: Readonly<Record<string, string>>;
}

/** An answer that is not a success, thrown from anywhere below a handler; the error handler writes it as RFC 9457 says. */
export class Problem extends Error {
  readonly errors?: readonly ProblemError[];
  readonly headers: Readonly<Record<string, string>>;

  constructor(
    readonly status: number,
    detail: string,
    { errors, headers = {} }: ProblemOptions = {},
  ) {
    super(detail);
    this.errors = errors;
    this.headers = headers;
  }

  get details(): ProblemDetails {
    const { status, message: detail, errors } = this;
    return { type: 'about:blank', title: STATUS_CODES[status] ?? 'Error', status, detail, ...(errors && { errors: [...errors] }) };
  }
}

const fromErrors = (errors: readonly ProblemError[]) => errors.map(({ detail }) => detail).join(' ');

/** 400: not JSON, a wrong type, a missing or an unknown field. */
export class Malformed extends Problem {
  constructor(errors: readonly ProblemError[]) {
    super(400, fromErrors(errors), { errors });
  }
}

/** 401: nobody is signed in, or the credentials are wrong. */
export class NotSignedIn extends Problem {
  constructor(detail = 'Sign in first.') {
    super(401, detail);
  }
}

/** 403: signed in, but may not. */
export class NotAllowed extends Problem {
  constructor(detail = 'Your role in this project does not allow this.') {
    super(403, detail);
  }
}

/** 404: not there, or not yours to know of. */
export class NotFound extends Problem {
  constructor(detail = 'There is nothing here.') {
    super(404, detail);
  }
}

/** 409: not in this state (already decided, built on a revision that is no longer the latest). */
export class Conflict extends Problem {
  constructor(detail: string, errors?: readonly ProblemError[]) {
    super(409, detail, { errors });
  }
}

/** 409: what is asked would change a project that is put away. */
export class Archived extends Conflict {
  constructor() {
    super('This project is archived and can only be read. An owner can take it out of the archive.');
  }
}

/** 422: well-formed, but out of range or without meaning. */
export class Meaningless extends Problem {
  constructor(errors: readonly ProblemError[]) {
    super(422, fromErrors(errors), { errors });
  }
}

/** 429: too many; `retryAfterSeconds` says when to come back. */
export class TooMany extends Problem {
  constructor(detail: string, retryAfterSeconds: number) {
    super(429, detail, { headers: { 'Retry-After': String(Math.max(1, Math.ceil(retryAfterSeconds))) } });
  }
}
