"use client";

import { ThemeScript } from "@/components/layout/theme";
import { TroublePage } from "@/components/layout/trouble-page";
import "./globals.css";

/** Stands in for the root layout when that itself fails, so it brings its own document and styles. */
export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en-US" suppressHydrationWarning>
      <head>
        <title>Something went wrong · Coastdown</title>
        <ThemeScript />
      </head>
      <body>
        <TroublePage error={error} retry={retry} />
      </body>
    </html>
  );
}
