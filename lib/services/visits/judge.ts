import type { Tx } from "@/db/client";
import { visitOverrides } from "@/db/schema/visits";
import { allowed, type Entered } from "@/lib/auth/actor";
import type { OverrideInput } from "@/lib/domain/visits/schemas";
import type { SlotReason } from "@/lib/domain/visits/slot";
import { REASON_FIELD } from "@/lib/domain/visits/words";
import { AppError, type FieldErrors } from "@/lib/errors";

type Judged = { visitId: string; reasons: readonly SlotReason[]; overrides: readonly OverrideInput[] };

/** Refuses with every reason that nobody went past in writing, each at the field that can mend it. */
export function mustStand(who: Entered, judged: readonly Judged[]): void {
  if (judged.some(({ overrides }) => overrides.length > 0) && !allowed(who, "visit:override"))
    throw new AppError("forbidden", "You may not go past what stands against a visit");
  const standing = judged.flatMap(({ reasons, overrides }) =>
    reasons.filter((reason) => !(reason.overridable && overrides.some(({ code }) => code === reason.code))),
  );
  if (standing.length === 0) return;
  const fieldErrors: FieldErrors = {};
  for (const { code, words } of standing) {
    const field = REASON_FIELD[code];
    fieldErrors[field] = [...(fieldErrors[field] ?? []), words];
  }
  throw new AppError("blocked", "The visit cannot stand there", fieldErrors);
}

/** Keeps what stood against each visit, as it was shown, and why somebody went past it. */
export async function keepOverrides(tx: Tx, who: Entered, judged: readonly Judged[]): Promise<void> {
  if (who.kind !== "person") return;
  const rows = judged.flatMap(({ visitId, reasons, overrides }) =>
    reasons.flatMap(({ code, words }) => {
      const note = overrides.find((one) => one.code === code)?.note;
      return note === undefined
        ? []
        : [{ companyId: who.companyId, visitId, reason: code, words, note, createdBy: who.memberId }];
    }),
  );
  if (rows.length > 0) await tx.insert(visitOverrides).values(rows);
}
