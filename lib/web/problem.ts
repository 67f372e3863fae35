import { AppError, type ErrorCode, type FieldErrors } from "@/lib/errors";
import { log } from "@/lib/log";

export const STATUS: Record<ErrorCode, number> = {
  unauthenticated: 401,
  forbidden: 403,
  not_found: 404,
  conflict: 409,
  blocked: 409,
  invalid: 422,
  limited: 429,
};

export const UNEXPECTED = "Something went wrong on our side";

type Problem = { status: number; title: string; code: string; requestId: string; errors?: FieldErrors };

/** RFC 9457. The request id is the one in the log. */
const problem = (body: Problem): Response =>
  Response.json(
    { type: "about:blank", ...body },
    { status: body.status, headers: { "content-type": "application/problem+json" } },
  );

/** Known refusals in their own words; of anything else only the request id leaves the house. */
export function toProblem(error: unknown, requestId: string): Response {
  if (error instanceof AppError) {
    const { code, message, fieldErrors } = error;
    return problem({ status: STATUS[code], title: message, code, requestId, errors: fieldErrors });
  }
  log().error({ err: error, requestId }, "unexpected");
  return problem({ status: 500, title: UNEXPECTED, code: "unexpected", requestId });
}
