import "server-only";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import type { Actor } from "@/lib/auth/actor";
import type { FormState } from "@/lib/domain/shared/form-state";
import { AppError } from "@/lib/errors";
import { log } from "@/lib/log";
import type { Verb } from "@/lib/services/command";
import { contextOf } from "./context";
import { UNEXPECTED } from "./problem";

/** `name[]` gathers all its values; any other name has one. Files and React's own fields are left out. */
export function inputOf(form: FormData): Record<string, string | string[]> {
  const input: Record<string, string | string[]> = {};
  for (const [name, value] of form.entries()) {
    if (name.startsWith("$") || typeof value !== "string") continue;
    if (name.endsWith("[]")) input[name.slice(0, -2)] = [...((input[name.slice(0, -2)] as string[]) ?? []), value];
    else input[name] = value;
  }
  return input;
}

const SECRET_FIELDS = /password|secret/i;

/** What was typed comes back to the form, but for secrets. */
const typedValues = (input: Record<string, string | string[]>): Record<string, string> =>
  Object.fromEntries(
    Object.entries(input).flatMap(([name, value]) =>
      typeof value === "string" && !SECRET_FIELDS.test(name) ? [[name, value]] : [],
    ),
  );

export function failed(error: unknown, form: FormData, requestId: string | undefined): FormState {
  const values = typedValues(inputOf(form));
  if (error instanceof AppError) {
    return { ok: false, message: error.message, fieldErrors: error.fieldErrors, values, at: Date.now() };
  }
  log().error({ err: error, requestId }, "unexpected");
  return { ok: false, message: `${UNEXPECTED} (${requestId})`, values, at: Date.now() };
}

type Options<R> = {
  /** Said when it worked. */
  done?: string;
  /** Where to go when it worked. */
  to?: (result: R) => string;
  /** A signed link's form posts its token under this name, and acts as the link. */
  linkField?: string;
};

/** A form's door to one verb. */
export function action<R>(verb: Verb<R>, { done, to, linkField }: Options<R> = {}) {
  return async (_: FormState, form: FormData): Promise<FormState> => {
    const actor: Actor | undefined = linkField ? { kind: "link", token: String(form.get(linkField)) } : undefined;
    const context = await contextOf(actor);
    let result: R;
    try {
      result = await verb(context, inputOf(form));
    } catch (error) {
      return failed(error, form, context.requestId);
    }
    revalidatePath("/", "layout");
    if (to) redirect(to(result));
    return { ok: true, message: done, at: Date.now() };
  };
}
