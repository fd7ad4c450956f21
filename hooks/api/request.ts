import type { ProblemDetails } from '@/contract';
import { reportLostSignal, reportSignal } from './signal';
import { ApiProblem, NoSignal } from './problem';

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

export interface RequestOptions {
  body?: unknown;
  /** The ETag of the version that is changed. */
  ifMatch?: string | null;
  signal?: AbortSignal;
}

export interface Answer<Body> {
  body: Body;
  etag: string | null;
}

const json = 'application/json';

async function problemOf(response: Response): Promise<ApiProblem> {
  const fallback: ProblemDetails = { type: 'about:blank', title: response.statusText, status: response.status, detail: '' };
  const details = await response.json().catch(() => fallback);
  return new ApiProblem({ ...fallback, ...details });
}

async function send(method: Method, path: string, { body, ifMatch, signal }: RequestOptions): Promise<Response> {
  const headers: Record<string, string> = { accept: json };
  if (body !== undefined) headers['content-type'] = json;
  if (ifMatch) headers['if-match'] = ifMatch;
  try {
    const response = await fetch(`/api${path}`, { method, headers, body: body === undefined ? undefined : JSON.stringify(body), signal });
    reportSignal();
    return response;
  } catch (cause) {
    if (signal?.aborted) throw cause;
    reportLostSignal();
    throw new NoSignal();
  }
}

/**
 * One request to `/api`, with its ETag.
 *
 * @throws ApiProblem where the server refuses, NoSignal where nobody answers.
 */
export async function ask<Body>(method: Method, path: string, options: RequestOptions = {}): Promise<Answer<Body>> {
  const response = await send(method, path, options);
  if (!response.ok) throw await problemOf(response);
  const text = await response.text();
  return { body: (text ? JSON.parse(text) : undefined) as Body, etag: response.headers.get('etag') };
}

/** One request to `/api`, its body alone. */
export async function request<Body>(method: Method, path: string, options: RequestOptions = {}): Promise<Body> {
  return (await ask<Body>(method, path, options)).body;
}
