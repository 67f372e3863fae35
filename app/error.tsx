"use client";

import { PublicShell } from "@/components/layout/public-shell";
import { Button } from "@/components/ui/button";

export default function ErrorPage({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">Something went wrong on our side</h1>
      <p>Nothing that you saved before is lost. Try again; if it stays, quote this number to us.</p>
      {error.digest && <p className="figures">{error.digest}</p>}
      <Button variant="primary" onClick={reset}>
        Try again
      </Button>
    </PublicShell>
  );
}
