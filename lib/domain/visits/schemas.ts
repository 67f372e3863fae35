import { z } from "zod";
import { rowId } from "@/lib/domain/shared/inputs";

const localTime = z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, "That is not a date and time");

export const PlanVisitInput = z
  .object({
    jobId: rowId,
    startsLocal: localTime,
    endsLocal: localTime,
    crew: z.array(rowId).min(1, "Choose who goes").max(20),
  })
  .refine((visit) => visit.endsLocal > visit.startsLocal, {
    path: ["endsLocal"],
    error: "The end lies before the start",
  });

export const CancelVisitInput = z.object({ visitId: rowId });
