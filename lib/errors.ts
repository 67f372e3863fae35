/** The one error vocabulary. Doors translate it; anything else stays secret. */
export const ERROR_CODES = [
  "unauthenticated",
  "forbidden",
  "not_found",
  "invalid",
  "conflict",
  "blocked",
  "limited",
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

/** Messages by field path; the empty path speaks of the whole input. */
export type FieldErrors = Record<string, string[]>;

export class AppError extends Error {
  override readonly name = "AppError";

  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly fieldErrors: FieldErrors = {},
  ) {
    super(message);
  }
}

export const notFound = (what: string) => new AppError("not_found", `There is no such ${what}`);
