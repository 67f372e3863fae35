import type { FormState } from "@/lib/domain/shared/form-state";

/** A refusal in its own words, with what is wrong at each field. */
export class Refused extends Error {
  constructor(
    message: string,
    readonly fieldErrors: NonNullable<FormState["fieldErrors"]> = {},
  ) {
    super(message);
  }
}

/** A read from one of our own routes; a refusal comes as an error in its own words. */
export const getJson = <T>(url: string, signal: AbortSignal): Promise<T> => answer<T>(fetch(url, { signal }));

/** A write to one of our own routes. */
export const postJson = <T>(url: string, body: unknown): Promise<T> =>
  answer<T>(
    fetch(url, { method: "POST", headers: { "content-type": "application/json" }, body: JSON.stringify(body) }),
  );

async function answer<T>(request: Promise<Response>): Promise<T> {
  const response = await request;
  const body = await response.json();
  if (response.ok) return body as T;
  throw new Refused(typeof body?.title === "string" ? body.title : "The answer could not be read", body?.errors);
}
