import { z } from "zod";
import { checked, optionalEmail, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";

export const CustomerInput = z.object({
  name: requiredText("Name"),
  phone: optionalText(40),
  billingStreet: optionalText(),
  billingCity: optionalText(100),
  billingState: optionalText(2),
  billingPostalCode: optionalText(10),
  note: optionalText(4000),
});

export const UpdateCustomerInput = CustomerInput.extend({ customerId: rowId });

export const ContactInput = z.object({
  customerId: rowId,
  name: requiredText("Name"),
  title: optionalText(100),
  email: optionalEmail,
  phone: optionalText(40),
  allSites: checked,
  siteIds: z.array(rowId).max(1000).default([]),
});

export const ContactRef = z.object({ contactId: rowId });
