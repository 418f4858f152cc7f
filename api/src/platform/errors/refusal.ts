import { z } from 'zod';

/** Each code of a refusal and the HTTP status that carries it: the one place where they meet. */
export const STATUS_BY_CODE = {
  invalid: 400,
  'link-spent': 400,
  unauthenticated: 401,
  'wrong-credentials': 401,
  forbidden: 403,
  unconfirmed: 403,
  'cross-site': 403,
  'not-found': 404,
  'code-unknown': 404,
  conflict: 409,
  'last-admin': 409,
  'too-large': 413,
  'wrong-content-type': 415,
  'too-many': 429,
  fault: 500,
  'not-ready': 503,
} as const;

export type RefusalCode = keyof typeof STATUS_BY_CODE;

/** What is wrong at one place of the input; `path` is dotted, empty for the whole. */
export type Misfit = { readonly path: string; readonly message: string };

/** A domain's "no": a value that is returned, with a code for programs and a sentence for a person. */
export class Refusal {
  constructor(
    readonly code: RefusalCode,
    readonly message: string,
    readonly where?: readonly Misfit[],
    readonly retryAfterS?: number,
  ) {}
}

/** Carries a refusal to the exception filter; made by `granted` and by the borders alone. */
export class RefusedError extends Error {
  constructor(readonly refusal: Refusal) {
    super(refusal.message);
  }
}

/** The result where there is one; a refusal goes to the caller of the route. */
export function granted<T>(result: T | Refusal): T {
  if (result instanceof Refusal) throw new RefusedError(result);
  return result;
}

/** Missing, deleted and other clubs' things are told apart by nobody: one code, one sentence. */
export function notFound(): Refusal {
  return new Refusal('not-found', 'There is nothing here that you may see.');
}

/** The body of every answer that is an error. */
export const errorAnswerSchema = z.strictObject({
  code: z.enum(Object.keys(STATUS_BY_CODE) as [RefusalCode, ...RefusalCode[]]),
  message: z.string(),
  where: z.array(z.strictObject({ path: z.string(), message: z.string() })).optional(),
  requestId: z.string(),
});
export type ErrorAnswer = z.infer<typeof errorAnswerSchema>;
