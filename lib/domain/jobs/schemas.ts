import { z } from "zod";
import { crewSize, functionList, visitMinutes } from "@/lib/domain/agreements/schemas";
import { calendarDateText, checked, optionalDate, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import { optionalDollars } from "@/lib/domain/shared/money";
import { JOB_KINDS, WAITS_FOR } from "./words";

const blankToNull = (value: unknown) => (value === "" ? null : value);

/** A call takes about two hours and one person, until somebody knows better; common practice, no source. */
const JobWork = z.object({
  kind: z.enum(JOB_KINDS, { error: "Choose a kind" }),
  title: requiredText("What is to be done"),
  systemId: z.preprocess(blankToNull, rowId.nullish().default(null)),
  details: optionalText(4000),
  urgent: checked,
  callerName: optionalText(100),
  callerPhone: optionalText(40),
  functions: functionList,
  visitMinutes: visitMinutes.default(120),
  crewSize: crewSize.default(1),
});

export const CreateJobInput = JobWork.extend({ siteId: z.uuid({ error: "Choose a site" }) });
export const UpdateJobInput = JobWork.extend({ jobId: rowId });
export const JobRef = z.object({ jobId: rowId });
export const CancelJobInput = JobRef.extend({ reason: requiredText("Why it is canceled") });
export const RecordDoneInput = JobRef.extend({ doneOn: calendarDateText });

export const WaitInput = JobRef.extend({
  waitsFor: z.enum(WAITS_FOR, { error: "Choose what it waits for" }),
  person: requiredText("Who is to deliver, open or approve", 100),
  untilDate: optionalDate,
  note: optionalText(),
});
export const WaitRef = z.object({ waitId: rowId });

export const JobTermsInput = JobRef.extend({
  purchaseOrder: optionalText(60),
  limit: optionalDollars,
  noneNeeded: checked,
}).superRefine((terms, context) => {
  const issue = (path: string, message: string) => context.addIssue({ code: "custom", path: [path], message });
  const given = terms.purchaseOrder !== null || terms.limit !== null;
  if (terms.noneNeeded && given) issue("noneNeeded", "There is a purchase order or a limit: then this does not hold");
  if (!terms.noneNeeded && !given) issue("purchaseOrder", "Give a number or a limit, or say that none is needed");
  if (terms.limit === 0) issue("limit", "A limit of nothing is no limit");
});
