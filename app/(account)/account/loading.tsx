import { PublicShell } from "@/components/layout/public-shell";
import { PageSkeleton } from "@/components/ui/skeleton";

export default function Loading() {
  return (
    <PublicShell>
      <PageSkeleton />
    </PublicShell>
  );
}
