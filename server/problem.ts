/** RFC 9457, with a `code` that callers can match and `fields` for what is wrong with a form. */
export interface ProblemDocument {
  type: 'about:blank';
  status: number;
  code: ProblemCode;
  title: string;
  detail: string;
  fields?: Record<string, string>;
  /** For `confirm`: which question the caller must answer. */
  question?: string;
}

const PROBLEMS = {
  invalid: { status: 422, title: 'Something in this form needs another look' },
  'sign-in': { status: 401, title: 'Sign in first' },
  forbidden: { status: 403, title: 'Your role cannot do this' },
  'not-found': { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'Somebody was faster' },
  'wrong-move': { status: 409, title: 'That cannot be done now' },
  'key-reused': { status: 409, title: 'This was sent before with other content' },
  confirm: { status: 409, title: 'Please confirm' },
  'too-many': { status: 429, title: 'Too many tries' },
  internal: { status: 500, title: 'Something went wrong on our side' },
} as const;

export type ProblemCode = keyof typeof PROBLEMS;

/** A refusal with words that a person can act on. Match it by `code`, never by class. */
export class Problem extends Error {
  constructor(
    readonly code: ProblemCode,
    detail: string,
    readonly extra: { fields?: Record<string, string>; question?: string } = {},
  ) {
    super(detail);
    this.name = 'Problem';
  }
}

const isProblem = (error: unknown): error is Problem =>
  error instanceof Error &&
  'code' in error &&
  typeof error.code === 'string' &&
  error.code in PROBLEMS;

/** Any error as a problem document. What is not ours says nothing about the inside. */
export function toProblemDocument(error: unknown): ProblemDocument {
  if (isProblem(error)) {
    const extra = 'extra' in error ? error.extra : undefined;
    return {
      type: 'about:blank',
      code: error.code,
      ...PROBLEMS[error.code],
      detail: error.message,
      ...extra,
    };
  }
  return {
    type: 'about:blank',
    code: 'internal',
    ...PROBLEMS.internal,
    detail: 'Nothing was changed. Try again; if it happens again, the server log has the cause.',
  };
}
