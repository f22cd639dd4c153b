/**
 * Every way a request can be refused, with its HTTP status and plain title: the one table that the
 * problem+json answers (RFC 9457), the client and the tests all read.
 */
export const errorTable = {
  unauthenticated: { status: 401, title: 'Sign in first' },
  forbidden: { status: 403, title: 'Your role may not do this' },
  not_found: { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'This does not fit what is there' },
  stale: { status: 412, title: 'Someone else saved first' },
  precondition_required: { status: 428, title: 'Say which version you are changing' },
  invalid: { status: 422, title: 'Some values cannot be used' },
  malformed: { status: 400, title: 'The request could not be read' },
  too_large: { status: 413, title: 'Too large' },
  unsupported: { status: 415, title: 'Content type not accepted' },
  too_many: { status: 429, title: 'Too many tries' },
  internal: { status: 500, title: 'Something broke on our side' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ErrorCode = keyof typeof errorTable;

/** Where in the input something is wrong, as a path a person can follow, and why. */
export interface Fault {
  readonly path: string;
  readonly message: string;
}

/** The one error that crosses layers: a code from the table, words for the person, and the places that are wrong. */
export class AppError extends Error {
  override readonly name = 'AppError';
  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly faults: readonly Fault[] = [],
    /** Anything the client needs to carry on, such as the version that won a conflict. */
    readonly extra: Readonly<Record<string, unknown>> = {},
  ) {
    super(message);
  }
}
