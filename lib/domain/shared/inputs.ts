import { z } from "zod";
import { isZone } from "./zone";

const LONGEST = 200;

/** An empty text field means nothing. */
const blankToNull = (value: unknown) => (typeof value === "string" && value.trim() === "" ? null : value);

export const requiredText = (label: string, longest = LONGEST) =>
  z
    .string({ error: `${label} is missing` })
    .trim()
    .min(1, `${label} is missing`)
    .max(longest, `${label} is too long`);

export const optionalText = (longest = LONGEST) =>
  z.preprocess(blankToNull, z.string().trim().max(longest, "That is too long").nullish().default(null));

export const emailAddress = z.string().trim().toLowerCase().pipe(z.email("That is not an e-mail address").max(254));
export const optionalEmail = z.preprocess(blankToNull, emailAddress.nullish().default(null));
export const zoneName = z.string().refine(isZone, "That is not a time zone");
export const calendarDateText = z.iso.date("That is not a date");
export const optionalDate = z.preprocess(blankToNull, calendarDateText.nullish().default(null));
export const rowId = z.uuid();
/** A check box posts `on` or nothing. */
export const checked = z.preprocess((value) => value === true || value === "on", z.boolean());

/** US states (ISO 3166-2:US subdivision codes) and the District of Columbia. */
export const US_STATES = [
  "AL",
  "AK",
  "AZ",
  "AR",
  "CA",
  "CO",
  "CT",
  "DE",
  "DC",
  "FL",
  "GA",
  "HI",
  "ID",
  "IL",
  "IN",
  "IA",
  "KS",
  "KY",
  "LA",
  "ME",
  "MD",
  "MA",
  "MI",
  "MN",
  "MS",
  "MO",
  "MT",
  "NE",
  "NV",
  "NH",
  "NJ",
  "NM",
  "NY",
  "NC",
  "ND",
  "OH",
  "OK",
  "OR",
  "PA",
  "RI",
  "SC",
  "SD",
  "TN",
  "TX",
  "UT",
  "VT",
  "VA",
  "WA",
  "WV",
  "WI",
  "WY",
] as const;

export const AddressInput = z.object({
  street: requiredText("Street"),
  city: requiredText("City", 100),
  state: z.enum(US_STATES, { error: "Choose a state" }),
  postalCode: z
    .string()
    .trim()
    .regex(/^\d{5}(-\d{4})?$/, "Five digits, or five and four"),
});
