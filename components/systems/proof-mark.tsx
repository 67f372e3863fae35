import { Badge } from "@/components/ui/badge";
import type { Proof } from "@/lib/domain/systems/device-list";

/** A dated fact, never a judgment: when it was last seen to work, or to fail, and how that was found. */
export function ProofMark({ proof }: { proof: Proof | undefined }) {
  if (!proof) return <Badge>Never proven</Badge>;
  const failed = proof.outcome === "failed";
  return (
    <span className="inline-grid justify-items-start gap-0.5">
      <Badge tone={failed ? "alert" : "settled"}>
        {failed ? "Failed" : "Proven"} <span className="figures">{proof.on}</span>
      </Badge>
      {proof.method && <span className="text-sm text-muted">{proof.method}</span>}
    </span>
  );
}
