import type { Metadata } from "next";
import { NothingHere } from "@/components/layout/nothing-here";
import { PublicShell } from "@/components/layout/public-shell";

export const metadata: Metadata = { title: "Nothing is here" };

export default function NotFound() {
  return (
    <PublicShell>
      <NothingHere />
    </PublicShell>
  );
}
