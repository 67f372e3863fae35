import { z } from "zod";
import { calendarDateText, emailAddress, optionalText, requiredText, rowId } from "@/lib/domain/shared/inputs";
import { STAFF_ROLES } from "@/lib/domain/shared/roles";

/** Long enough to resist guessing, short enough for argon2 not to be a lever against us (NIST SP 800-63B 5.1.1.2). */
export const Password = z
  .string({ error: "Choose a password" })
  .min(12, "At least 12 characters")
  .max(200, "At most 200 characters");

export const InviteStaffInput = z.object({
  name: requiredText("Name"),
  email: emailAddress,
  role: z.enum(STAFF_ROLES, { error: "Choose a role" }),
  phone: optionalText(40),
});

export const NewPasswordInput = z.object({ password: Password });

export const ChangePasswordInput = z.object({
  currentPassword: z.string({ error: "Type your password" }).min(1, "Type your password").max(200),
  password: Password,
});

export const ChangeRoleInput = z.object({ memberId: rowId, role: z.enum(STAFF_ROLES, { error: "Choose a role" }) });

export const MemberRef = z.object({ memberId: rowId });

export const LicenseInput = z.object({
  memberId: rowId,
  kind: requiredText("Kind"),
  number: requiredText("Number", 60),
  jurisdiction: requiredText("Jurisdiction", 60),
  expiresOn: calendarDateText,
});

export const HomeInput = z.object({
  memberId: rowId,
  street: requiredText("Street"),
  city: requiredText("City", 100),
  state: requiredText("State", 2),
  postalCode: requiredText("Postal code", 10),
  latitude: z.coerce.number().min(-90).max(90).nullish().default(null),
  longitude: z.coerce.number().min(-180).max(180).nullish().default(null),
});
