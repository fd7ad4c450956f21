import { z } from 'zod';

/** One thing wrong with a request; `pointer` is a JSON Pointer (RFC 6901) into the body, `#` the body itself. */
export const ProblemError = z.object({ pointer: z.string(), detail: z.string() });
export type ProblemError = z.infer<typeof ProblemError>;

/** RFC 9457 problem details: the body of every answer that is not a success. */
export const ProblemDetails = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string(),
    errors: z.array(ProblemError).optional(),
  })
  .meta({ id: 'ProblemDetails' });
export type ProblemDetails = z.infer<typeof ProblemDetails>;
