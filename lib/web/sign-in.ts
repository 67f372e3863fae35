import "server-only";
import { headers } from "next/headers";
import { redirect } from "next/navigation";
import { AuthError } from "next-auth";
import { z } from "zod";
import { requestAccess } from "@/lib/auth/access-requests";
import { signIn, signOut } from "@/lib/auth/auth";
import { countAttempt, forgetAttempts } from "@/lib/auth/limits";
import type { FormState } from "@/lib/domain/shared/form-state";
import { emailAddress } from "@/lib/domain/shared/inputs";
import { paths } from "@/lib/domain/shared/paths";
import { AppError } from "@/lib/errors";
import { parse } from "@/lib/services/command";
import { failed, inputOf } from "./action";
import { requestId } from "./context";

/** The last hop is the one that our own proxy saw; earlier ones are the client's word. */
async function clientAddress(): Promise<string> {
  return (await headers()).get("x-forwarded-for")?.split(",").at(-1)?.trim() ?? "unknown";
}

type Step = (input: Record<string, string | string[]>) => Promise<FormState>;

/** Before anybody is known: counted by address, then one step. What is not a refusal is logged, never shown. */
function publicAction(step: Step) {
  return async (_: FormState, form: FormData): Promise<FormState> => {
    try {
      await countAttempt("address", await clientAddress());
      return await step(inputOf(form));
    } catch (error) {
      // Next.js tells the browser to go elsewhere by throwing.
      if (error instanceof Error && "digest" in error) throw error;
      return failed(error, form, await requestId());
    }
  };
}

/** Only a path of this site: never a way to send people elsewhere after signing in. */
const nextPath = z
  .string()
  .regex(/^\/(?![/\\])/)
  .catch("/")
  .default("/");

const PasswordSignIn = z.object({
  email: emailAddress,
  password: z.string({ error: "Type your password" }).min(1, "Type your password").max(200),
  next: nextPath,
});

export const passwordSignIn = publicAction(async (raw) => {
  const { email, password, next } = parse(PasswordSignIn, raw);
  await countAttempt("account", email);
  try {
    await signIn("password", { email, password, redirect: false });
  } catch (error) {
    if (error instanceof AuthError) throw new AppError("invalid", "E-mail address or password is not right");
    throw error;
  }
  await forgetAttempts("account", email);
  redirect(next);
});

const LinkRequest = z.object({ email: emailAddress, next: nextPath });

export const linkSignIn = publicAction(async (raw) => {
  const { email, next } = parse(LinkRequest, raw);
  await countAttempt("mail", email);
  await signIn("email", { email, redirect: false, redirectTo: next });
  return {
    ok: true,
    message: "If we know that address, a link is on its way. It works once, for 15 minutes.",
    at: Date.now(),
  };
});

export const askPasswordReset = publicAction(async (raw) => {
  const { email } = parse(z.object({ email: emailAddress }), raw);
  await countAttempt("mail", email);
  await requestAccess({ kind: "password_reset", email });
  return {
    ok: true,
    message: "If we know that address, a letter is on its way. Its link works once, for an hour.",
    at: Date.now(),
  };
});

export async function leave(): Promise<void> {
  await signOut({ redirectTo: paths.signIn });
}
