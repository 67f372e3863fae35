import type { Metadata } from "next";
import { FieldToday } from "@/components/field/field-today";

export const metadata: Metadata = { title: "Today" };

/** A static shell: nothing in it depends on who is asking, so that it can open without a network. */
export const dynamic = "force-static";

export default function FieldPage() {
  return <FieldToday />;
}
