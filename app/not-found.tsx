import type { Metadata } from "next";
import Link from "next/link";
import { PublicShell } from "@/components/layout/public-shell";
import { Button } from "@/components/ui/button";

export const metadata: Metadata = { title: "Nothing is here" };

export default function NotFound() {
  return (
    <PublicShell>
      <div className="grid gap-3">
        <h1 className="text-2xl font-bold">Nothing is here</h1>
        <p>Either the address is wrong, or what it names is not yours to see.</p>
      </div>
      <div>
        <Button asChild variant="primary" size="thumb">
          <Link href="/">To your first screen</Link>
        </Button>
      </div>
    </PublicShell>
  );
}
