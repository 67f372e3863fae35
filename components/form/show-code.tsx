"use client";

import { useMutation } from "@tanstack/react-query";
import { useEffect } from "react";
import { Button } from "@/components/ui/button";
import { lookAtSecret } from "@/lib/queries/secrets";

const SHOWN_MS = 60_000;

/** Asks before it shows, hides by itself; kept nowhere but here. */
export function ShowCode({
  secretId,
  label,
  size = "small",
}: {
  secretId: string;
  label: string;
  size?: "small" | "thumb";
}) {
  const look = useMutation({ mutationFn: () => lookAtSecret(secretId), gcTime: 0 });
  const { data, reset } = look;
  useEffect(() => {
    if (!data) return;
    const hide = setTimeout(reset, SHOWN_MS);
    return () => clearTimeout(hide);
  }, [data, reset]);
  return (
    <span className="flex flex-wrap items-center gap-2" data-print="off">
      <span role="status" className="figures text-lg font-bold select-all empty:absolute">
        {data?.code}
      </span>
      {look.error && (
        <span role="alert" className="text-sm font-semibold text-alert">
          {look.error.message}
        </span>
      )}
      <Button size={size} pending={look.isPending} onClick={() => (data ? reset() : look.mutate())}>
        {data ? "Hide" : "Show code"}
        <span className="sr-only"> of {label}</span>
      </Button>
    </span>
  );
}
