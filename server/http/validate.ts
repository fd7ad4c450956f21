import type { z } from 'zod';
import { issueErrors } from './issues';
import { Malformed, Meaningless, NotFound } from './problem';

/**
 * Reads a body or query by its schema.
 * @throws Malformed for a wrong type, a missing or an unknown field; Meaningless where only values are out of range
 */
export function validate<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const { errors, malformed } = issueErrors(result.error.issues, value);
  throw malformed ? new Malformed(errors) : new Meaningless(errors);
}

/**
 * Reads the path's parameters. What cannot be an id names nothing.
 * @throws NotFound
 */
export function validateParams<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value);
  if (!result.success) throw new NotFound();
  return result.data;
}
