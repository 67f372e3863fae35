import { z } from "zod";
import { calendarDateText, optionalDate, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import { FUNCTIONS } from "@/lib/domain/systems/words";

const functions = z.array(z.enum(FUNCTIONS), { error: "Choose at least one" }).min(1, "Choose at least one");
const clock = z.string({ error: "That is not a time" }).regex(/^([01]\d|2[0-3]):[0-5]\d$/, "That is not a time");
const inOrder = ({ fromDate, toDate }: { fromDate: string | null; toDate: string | null }) =>
  fromDate === null || toDate === null || toDate >= fromDate;
const ORDER = { path: ["toDate"], error: "The last date lies before the first" };

export const WindowInput = z
  .object({
    siteId: rowId,
    functions,
    weekdays: z.array(z.coerce.number().int().min(1).max(7)).default([]),
    onDate: optionalDate,
    startsLocal: clock,
    endsLocal: clock,
    fromDate: optionalDate,
    toDate: optionalDate,
    noticeHours: z.coerce
      .number({ error: "That is not a number" })
      .int("Whole hours")
      .min(0, "Not below 0")
      .max(1000, "That is too long")
      .default(0),
    note: optionalText(1000),
  })
  .refine((window) => window.weekdays.length > 0 !== (window.onDate !== null), {
    path: ["onDate"],
    error: "Choose weekdays, or one date",
  })
  .refine(inOrder, ORDER);
export const WindowRef = z.object({ windowId: rowId });

export const NoTestInput = z
  .object({
    siteId: rowId,
    functions,
    fromDate: calendarDateText,
    toDate: calendarDateText,
    reason: requiredText("Reason"),
  })
  .refine(inOrder, ORDER);
export const NoTestRef = z.object({ noTestId: rowId });

export const AttendanceInput = z.object({
  siteId: rowId,
  functions,
  party: requiredText("Who"),
  contactId: z.preprocess((value) => (value === "" ? null : value), rowId.nullish().default(null)),
  phone: optionalText(40),
});
export const AttendanceRef = z.object({ attendanceId: rowId });
