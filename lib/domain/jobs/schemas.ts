import { z } from "zod";
import { requiredText, rowId } from "@/lib/domain/shared/inputs";
import { JOB_KINDS } from "./words";

export const CreateJobInput = z.object({
  siteId: rowId,
  kind: z.enum(JOB_KINDS, { error: "Choose a kind" }),
  title: requiredText("What is to be done"),
});
