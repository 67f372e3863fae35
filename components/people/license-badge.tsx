import { Badge, type Tone } from "@/components/ui/badge";
import type { LicenseState } from "@/lib/domain/people/license-state";

const TONE: Record<LicenseState["kind"], Tone> = { valid: "settled", expiring: "soon", expired: "alert" };

const words = ({ kind, daysLeft }: LicenseState) => {
  if (kind === "expired") return `ended ${-daysLeft} days ago`;
  return daysLeft === 0 ? "ends today" : `${daysLeft} days left`;
};

export const LicenseBadge = ({ state }: { state: LicenseState }) => (
  <Badge tone={TONE[state.kind]}>{words(state)}</Badge>
);
