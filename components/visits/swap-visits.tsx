"use client";

import { SelectField } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import { clockOf } from "@/lib/domain/visits/clock";
import type { SheetVisit } from "@/lib/queries/visits";
import { formAction, usePosting } from "./use-posting";

type Props = { visit: SheetVisit; others: SheetVisit[]; onDone: () => void };

/** Two visits of the day exchange crews or times in one step. */
export function SwapVisits({ visit, others, onDone }: Props) {
  const post = usePosting();
  const swap = formAction(async ({ other, exchange }) => {
    const second = others.find((one) => one.id === other);
    await post("/api/visits/swap", {
      first: { visitId: visit.id, sequence: visit.sequence },
      second: { visitId: other, sequence: second?.sequence },
      exchange,
    });
    return "The visits have been swapped";
  });
  if (others.length === 0) return null;
  return (
    <details>
      <summary className="cursor-pointer font-semibold">Swap with another visit</summary>
      <Form action={swap} say="toast" onDone={onDone} className="mt-3 grid gap-3">
        <SelectField label="With" name="other">
          {others.map((other) => (
            <option key={other.id} value={other.id}>
              {clockOf(other.startsLocal)} {other.site.name}, {other.crew[0]?.name}
            </option>
          ))}
        </SelectField>
        <SelectField label="They exchange" name="exchange">
          <option value="crews">their crews</option>
          <option value="times">the times at which they begin</option>
        </SelectField>
        <SubmitButton variant="quiet">Swap</SubmitButton>
      </Form>
    </details>
  );
}
