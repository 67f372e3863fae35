"use client";

import { Trouble } from "@/components/layout/trouble-page";

/** Inside the shell: one page's trouble leaves the others within reach. */
export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  return <Trouble error={error} retry={retry} />;
}
