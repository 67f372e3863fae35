import "server-only";
import { notFound } from "next/navigation";
import { cache } from "react";
import { mayDo, type Permission } from "@/lib/domain/shared/permissions";
import { getFrame } from "@/lib/services/company/get-frame";
import { read } from "@/lib/web/page";

/** The company and who is signed in: asked once for a page and its layouts. */
export const frame = cache(() => read(getFrame));

export const may = async (permission: Permission): Promise<boolean> => mayDo((await frame()).role, permission);

/** For a page that is nothing but a form: whoever may not send it finds no page. */
export async function only(permission: Permission): Promise<void> {
  if (!(await may(permission))) notFound();
}
