import "server-only";
import { notFound } from "next/navigation";
import { env } from "@/lib/env";

/** A page for whoever builds the product: in production there is no such page. */
export function developmentOnly(): void {
  if (env().NODE_ENV !== "development") notFound();
}
