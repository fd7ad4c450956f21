import type { z } from 'zod';
import type { ProblemError } from '@/contract';

type Issue = z.core.$ZodIssue;

/** A JSON Pointer (RFC 6901) into the body; `#` is the body itself. */
export function pointerOf(path: readonly PropertyKey[]): string {
  if (path.length === 0) return '#';
  return path.map((key) => `/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}

const valueAt = (value: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>((inner, key) => (inner as Record<PropertyKey, unknown> | null | undefined)?.[key], value);

const kindOf = (value: unknown) => (value === null ? 'null' : Array.isArray(value) ? 'array' : typeof value);

/** A union says only that no branch fits; the branch that got furthest says what is wrong with the value. */
function closestBranch(branches: readonly (readonly Issue[])[]): readonly Issue[] {
  const depth = (issues: readonly Issue[]) => Math.max(...issues.map(({ path }) => path.length));
  return [...branches].sort((a, b) => depth(b) - depth(a) || a.length - b.length)[0] ?? [];
}

function leaves(issues: readonly Issue[], prefix: readonly PropertyKey[] = []): Issue[] {
  return issues.flatMap((issue) => {
    const path = [...prefix, ...issue.path];
    if (issue.code === 'invalid_union' && issue.errors.length > 0) return leaves(closestBranch(issue.errors), path);
    if (issue.code === 'unrecognized_keys')
      return issue.keys.map((key) => ({ ...issue, path: [...path, key], message: `The field “${key}” is not known here.` }));
    return [{ ...issue, path }];
  });
}

/** Whether the value has the wrong shape (400), rather than the right shape and no meaning (422). */
function isMalformed(issue: Issue, value: unknown): boolean {
  if (issue.code === 'unrecognized_keys' || issue.code === 'invalid_type' || value === undefined) return true;
  if (issue.code === 'invalid_value') return !issue.values.some((allowed) => kindOf(allowed) === kindOf(value));
  return issue.code === 'invalid_union' && kindOf(value) !== 'string';
}

const NO_BODY = 'A body is needed: JSON, sent with Content-Type: application/json.';

function detailOf(issue: Issue, value: unknown): string {
  if (issue.code === 'unrecognized_keys') return issue.message;
  if (value === undefined) return issue.path.length === 0 ? NO_BODY : 'This field is needed.';
  if (issue.code === 'invalid_type') return `This is ${kindOf(value)}; ${issue.expected} is needed.`;
  if (issue.code === 'invalid_value') return `One of ${issue.values.map(String).join(', ')} is needed.`;
  if (issue.code === 'invalid_union') return 'This is none of the kinds known here.';
  return issue.message;
}

const firstAtEach = (errors: readonly ProblemError[]) =>
  errors.filter(({ pointer }, index) => errors.findIndex((other) => other.pointer === pointer) === index);

/** What a schema found wrong, one sentence per place in the body, and whether any of it is the shape. */
export function issueErrors(issues: readonly Issue[], body: unknown): { errors: ProblemError[]; malformed: boolean } {
  const found = leaves(issues).map((issue) => ({ issue, value: valueAt(body, issue.path) }));
  return {
    errors: firstAtEach(found.map(({ issue, value }) => ({ pointer: pointerOf(issue.path), detail: detailOf(issue, value) }))),
    malformed: found.some(({ issue, value }) => isMalformed(issue, value)),
  };
}
