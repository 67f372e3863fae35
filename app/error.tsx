"use client";

import { TroublePage } from "@/components/layout/trouble-page";

export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  return <TroublePage error={error} retry={retry} />;
}
