import type { z } from 'zod';
import { pointerOf } from './issues';

type Path = readonly PropertyKey[];

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;

/** Where `told` says something that `declared`, the same answer read by its schema, has dropped. */
function undeclared(told: unknown, declared: unknown, path: Path = []): Path[] {
  if (!isObject(told) || !isObject(declared)) return [];
  return Object.keys(told).flatMap((key) => {
    if (told[key] === undefined) return [];
    return key in declared ? undeclared(told[key], declared[key], [...path, key]) : [[...path, key]];
  });
}

/**
 * Holds an answer against what its route declares, so that the OpenAPI document cannot lie and nothing private slips out.
 * Costs a second reading of every answer, hence for tests.
 * @throws Error naming what is missing, wrong or undeclared
 */
export function checkAnswer(schema: z.ZodType, body: unknown): void {
  const declared = schema.parse(body);
  const extra = undeclared(body, declared).map(pointerOf);
  if (extra.length > 0) throw new Error(`The answer tells what its schema does not declare: ${extra.join(', ')}`);
}
