"use client";

import { toast } from "sonner";
import { TextField } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import type { Placing, SheetVisit } from "@/lib/queries/visits";
import { formAction, usePosting } from "./use-posting";

/** Tells everybody who was asked; what was canceled can be planned again as it stood. */
export function CancelVisit({ visit, onDone }: { visit: SheetVisit; onDone: () => void }) {
  const post = usePosting();
  const planAgain = async (jobId: string, placing: Placing) => {
    try {
      await post("/api/visits", { jobId, ...placing });
      toast.success("Planned again, as it stood; ask the building anew");
    } catch (error) {
      toast.error(error instanceof Error ? error.message : "It could not be planned again");
    }
  };
  const cancel = formAction(async ({ reason }) => {
    const { jobId, placing } = await post<{ jobId: string; placing: Placing }>(`/api/visits/${visit.id}/cancel`, {
      reason,
    });
    toast.success("The visit is canceled", {
      duration: 20_000,
      action: { label: "Plan again", onClick: () => void planAgain(jobId, placing) },
    });
    return undefined;
  });
  return (
    <details>
      <summary className="cursor-pointer font-semibold text-alert">Cancel the visit</summary>
      <Form action={cancel} onDone={onDone} className="mt-3 grid gap-3">
        <TextField label="Reason" name="reason" hint="Everybody who was asked reads it." />
        <SubmitButton variant="danger">Cancel the visit</SubmitButton>
      </Form>
    </details>
  );
}
