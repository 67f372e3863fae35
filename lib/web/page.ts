import "server-only";
import { headers } from "next/headers";
import { notFound, redirect } from "next/navigation";
import { paths } from "@/lib/domain/shared/paths";
import { AppError } from "@/lib/errors";
import type { Verb } from "@/lib/services/command";
import { contextOf } from "./context";

export const PATH_HEADER = "x-path";

/** A page's read: strangers go to the sign-in page and come back, what is not theirs is not there. */
export async function read<R>(verb: Verb<R>, input: unknown = {}): Promise<R> {
  try {
    return await verb(await contextOf(), input);
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    if (error.code === "unauthenticated") {
      const next = (await headers()).get(PATH_HEADER) ?? "/";
      redirect(`${paths.signIn}?next=${encodeURIComponent(next)}`);
    }
    if (error.code === "not_found" || error.code === "forbidden" || error.code === "invalid") notFound();
    throw error;
  }
}
