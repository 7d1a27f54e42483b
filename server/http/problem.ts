import type { Problem as ProblemBody } from '#shared/contracts/common.ts';

/** Everything that can go wrong on purpose. One kind, one status: the table below is exhaustive. */
export type ProblemKind =
  | 'invalid'
  | 'signed-out'
  | 'forbidden'
  | 'not-found'
  | 'wrong-method'
  | 'conflict'
  | 'stale'
  | 'too-large'
  | 'wrong-media'
  | 'cannot-take'
  | 'too-many'
  | 'unavailable'
  | 'our-fault';

const TABLE: Record<ProblemKind, { status: number; title: string }> = {
  invalid: { status: 400, title: 'Something in the request is not right' },
  'signed-out': { status: 401, title: 'Not signed in' },
  forbidden: { status: 403, title: 'Not yours to do' },
  'not-found': { status: 404, title: 'Not found' },
  'wrong-method': { status: 405, title: 'That cannot be done here' },
  conflict: { status: 409, title: 'Already so, or in the way of something else' },
  stale: { status: 412, title: 'Changed by someone else meanwhile' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-media': { status: 415, title: 'Wrong kind of content' },
  'cannot-take': { status: 422, title: 'Understood, but cannot be taken' },
  'too-many': { status: 429, title: 'Too many tries' },
  unavailable: { status: 503, title: 'Not available right now' },
  'our-fault': { status: 500, title: 'Something broke on our side' },
};

export type FieldError = NonNullable<ProblemBody['errors']>[number];

/** An expected failure. `detail` is written for the person who reads it. */
export class Problem extends Error {
  readonly kind: ProblemKind;
  readonly detail: string;
  readonly errors: readonly FieldError[];
  /** Seconds after which another try makes sense. */
  readonly retryAfter: number | undefined;

  constructor(
    kind: ProblemKind,
    detail: string,
    more: { errors?: readonly FieldError[]; retryAfter?: number } = {},
  ) {
    super(`${kind}: ${detail}`);
    this.name = 'Problem';
    this.kind = kind;
    this.detail = detail;
    this.errors = more.errors ?? [];
    this.retryAfter = more.retryAfter;
  }

  get status(): number {
    return TABLE[this.kind].status;
  }
}

export const notFound = (detail: string) => new Problem('not-found', detail);
export const signedOut = (detail = 'Sign in to go on.') => new Problem('signed-out', detail);
export const forbidden = (detail: string) => new Problem('forbidden', detail);
export const stale = (detail: string) => new Problem('stale', detail);

/** RFC 9457 body of a problem. */
export function problemBody(problem: Problem, requestId?: string): ProblemBody {
  const { status, title } = TABLE[problem.kind];
  return {
    type: `/problems/${problem.kind}`,
    title,
    status,
    detail: problem.detail,
    ...(requestId ? { requestId } : {}),
    ...(problem.errors.length > 0 ? { errors: [...problem.errors] } : {}),
  };
}
