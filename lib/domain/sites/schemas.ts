import { z } from "zod";
import {
  AddressInput,
  calendarDateText,
  optionalDate,
  optionalText,
  requiredText,
  rowId,
  zoneName,
} from "@/lib/domain/shared/inputs";
import { DOCUMENT_KINDS, HOLDER_CAPACITIES, KEY_KINDS, SECRET_KINDS, SITE_KINDS } from "./words";

/** Empty means not known, which is not the equator. */
const coordinate = (limit: number) =>
  z.preprocess(
    (value) => (value === "" || value === undefined ? null : value),
    z.union([
      z.null(),
      z.coerce.number({ error: "That is not a number" }).min(-limit, "Out of range").max(limit, "Out of range"),
    ]),
  );

export const SiteInput = AddressInput.extend({
  name: requiredText("Name"),
  kind: z.enum(SITE_KINDS, { error: "Choose a kind" }),
  zone: zoneName,
  latitude: coordinate(90),
  longitude: coordinate(180),
  accessNote: optionalText(4000),
  authorityName: optionalText(),
  authorityPhone: optionalText(40),
});

export const UpdateSiteInput = SiteInput.extend({ siteId: rowId });

export const HolderInput = z
  .object({
    siteId: rowId,
    customerId: rowId,
    capacity: z.enum(HOLDER_CAPACITIES, { error: "Choose a capacity" }),
    fromDate: calendarDateText,
    toDate: optionalDate,
  })
  .refine((holder) => holder.toDate === null || holder.toDate >= holder.fromDate, {
    path: ["toDate"],
    error: "The last date lies before the first",
  });

export const EndHolderInput = z.object({ holderId: rowId, toDate: calendarDateText });

export const StationAccountInput = z.object({
  siteId: rowId,
  station: requiredText("Station"),
  phone: requiredText("Telephone", 40),
  accountNumber: requiredText("Account number", 40),
  note: optionalText(1000),
});
export const StationAccountRef = z.object({ stationAccountId: rowId });

export const KeyInput = z.object({
  siteId: rowId,
  kind: z.enum(KEY_KINDS, { error: "Choose a kind" }),
  label: requiredText("What it opens"),
  keptBy: requiredText("Where it is"),
});
export const HandOverKeyInput = z.object({ keyId: rowId, keptBy: requiredText("Where it is") });
export const KeyRef = z.object({ keyId: rowId });

export const DocumentInput = z.object({
  siteId: rowId,
  kind: z.enum(DOCUMENT_KINDS, { error: "Choose a kind" }),
  title: requiredText("Title"),
  dated: optionalDate,
  keptWhere: requiredText("Where it is kept"),
});
export const DocumentRef = z.object({ documentId: rowId });

export const SecretInput = z.object({
  siteId: rowId,
  kind: z.enum(SECRET_KINDS, { error: "Choose a kind" }),
  label: requiredText("Label"),
  secret: requiredText("Code", 100),
});
export const SecretRef = z.object({ secretId: rowId });
