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
import { HOLDER_CAPACITIES, SITE_KINDS } from "./words";

export const SiteInput = AddressInput.extend({
  name: requiredText("Name"),
  kind: z.enum(SITE_KINDS, { error: "Choose a kind" }),
  zone: zoneName,
  latitude: z.coerce.number().min(-90).max(90).nullish().default(null),
  longitude: z.coerce.number().min(-180).max(180).nullish().default(null),
  accessNote: optionalText(4000),
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
