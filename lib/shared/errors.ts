/** The closed set of ways a command or query can refuse. Doors map each to one HTTP status. */
export type ErrorCode =
  | "invalid_input"
  | "not_signed_in"
  | "forbidden"
  | "not_found"
  | "conflict"
  | "stale_version"
  | "too_large"
  | "refused_by_rule"
  | "rate_limited"
  | "unavailable";

export interface FieldProblem {
  /** Dotted path of the field, empty for the whole input. */
  path: string;
  message: string;
}

/** The one error class. `message` is safe to show to anybody; `detail` goes to the log only. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly detail: string | undefined;
  readonly problems: readonly FieldProblem[];
  readonly retryAfterS: number | undefined;
  /** The stored version of a record, when a stale save was refused: shown beside what was typed. */
  readonly current: Record<string, unknown> | undefined;

  constructor(
    code: ErrorCode,
    message: string,
    options: {
      detail?: string;
      problems?: readonly FieldProblem[];
      retryAfterS?: number;
      current?: Record<string, unknown>;
      cause?: unknown;
    } = {},
  ) {
    super(message, { cause: options.cause });
    this.name = "AppError";
    this.code = code;
    this.detail = options.detail;
    this.problems = options.problems ?? [];
    this.retryAfterS = options.retryAfterS;
    this.current = options.current;
  }
}
