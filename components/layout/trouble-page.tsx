"use client";

import { Button } from "@/components/ui/button";
import { Figures } from "@/components/ui/figures";
import { PublicShell } from "./public-shell";

const digestOf = (error: unknown): string | undefined =>
  error instanceof Error && "digest" in error && typeof error.digest === "string" ? error.digest : undefined;

type Props = { error: unknown; retry: () => void };

export const TroublePage = (props: Props) => (
  <PublicShell>
    <Trouble {...props} />
  </PublicShell>
);

/** Our failure, not theirs: what is safe, what to do, and a number that finds it in the log. */
export function Trouble({ error, retry }: Props) {
  const digest = digestOf(error);
  return (
    <div className="grid gap-6">
      <div className="grid gap-3" role="alert">
        <h1 className="text-2xl font-bold">Something went wrong on our side</h1>
        <p>What you saved before is safe. Try again; if it happens a second time, tell us{digest && " this number"}.</p>
        {digest && (
          <p>
            <span className="text-muted">Error number </span>
            <Figures className="font-semibold select-all">{digest}</Figures>
          </p>
        )}
      </div>
      <div className="flex flex-wrap gap-2">
        <Button variant="primary" size="thumb" onClick={retry}>
          Try again
        </Button>
        <Button size="thumb" asChild>
          {/* A plain link: the page is loaded afresh, whatever state this one is in. */}
          <a href="/">To your first screen</a>
        </Button>
      </div>
    </div>
  );
}
