"use client";

import { PhoneIncoming } from "lucide-react";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { useEffect } from "react";
import { Button } from "@/components/ui/button";
import { paths } from "@/lib/domain/shared/paths";
import { isTyping } from "./is-typing";

/** The telephone rings: `c` from anywhere. */
export function NewCallButton() {
  const router = useRouter();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const chord = event.ctrlKey || event.metaKey || event.altKey;
      if (event.key !== "c" || chord || event.defaultPrevented || isTyping(event.target)) return;
      event.preventDefault();
      router.push(paths.newJob());
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [router]);
  return (
    <Button asChild>
      <Link href={paths.newJob()} aria-keyshortcuts="c">
        <PhoneIncoming aria-hidden className="size-4" />
        <span className="max-sm:sr-only">New call</span>
        <kbd aria-hidden className="figures rounded border border-line px-1 text-sm text-muted max-sm:hidden">
          c
        </kbd>
      </Link>
    </Button>
  );
}
