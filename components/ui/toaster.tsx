"use client";

import { CircleAlert, CircleCheck, Info } from "lucide-react";
import { Toaster as Parts } from "sonner";

/** Stands once in the root layout; `toast` from sonner speaks through it. */
export function Toaster() {
  return (
    <Parts
      position="bottom-right"
      mobileOffset={{ bottom: "5rem" }}
      icons={{
        success: <CircleCheck aria-hidden className="size-5 text-settled" />,
        error: <CircleAlert aria-hidden className="size-5 text-alert" />,
        info: <Info aria-hidden className="size-5 text-muted" />,
      }}
      toastOptions={{
        unstyled: true,
        duration: 6000,
        classNames: {
          toast:
            "flex w-full items-center gap-3 rounded-md border border-line border-l-4 border-l-settled bg-surface px-4 py-3 text-text shadow-lg sm:w-96",
          error: "border-l-alert",
          content: "grow",
          title: "font-semibold",
          description: "text-sm text-muted",
          actionButton: "ml-auto min-h-8 cursor-pointer rounded-md border border-field-line px-3 font-semibold",
        },
      }}
    />
  );
}
