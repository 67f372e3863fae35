"use client";

import { useId } from "react";
import { Callout } from "@/components/ui/card";
import { Input } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import type { SlotReason } from "@/lib/domain/visits/slot";
import type { SlotReasonCode } from "@/lib/domain/visits/words";

type Props = {
  reasons: SlotReason[];
  notes: Partial<Record<SlotReasonCode, string>>;
  onNote: (code: SlotReasonCode, note: string) => void;
};

/** What stands against the fields above; what may be gone past asks why, in writing. */
export function ReasonsAt({ reasons, notes, onNote }: Props) {
  const id = useId();
  if (reasons.length === 0) return null;
  const codes = [...new Set(reasons.map(({ code }) => code))];
  return (
    <Callout tone={reasons.every((reason) => reason.overridable) ? "soon" : "alert"} role="status">
      {codes.map((code) => {
        const own = reasons.filter((reason) => reason.code === code);
        return (
          <div key={code} className="grid gap-1">
            {own.map(({ words }) => (
              <p key={words}>{words}</p>
            ))}
            {own.every(({ overridable }) => overridable) && (
              <>
                <Label htmlFor={`${id}-${code}`}>Book it all the same, because</Label>
                <Input
                  id={`${id}-${code}`}
                  value={notes[code] ?? ""}
                  maxLength={500}
                  onChange={(event) => onNote(code, event.target.value)}
                />
              </>
            )}
          </div>
        );
      })}
    </Callout>
  );
}
