import { type CalendarDate, daysBetween } from "@/lib/domain/shared/zone";

/** Warned this long before the end; common practice, no source. */
export const LICENSE_WARNING_DAYS = 60;

export type LicenseState = { kind: "valid" | "expiring" | "expired"; daysLeft: number };

/** A license is good through its last day: `daysLeft` is 0 on that day and negative after it. */
export function licenseState(expiresOn: CalendarDate, today: CalendarDate): LicenseState {
  const daysLeft = daysBetween(today, expiresOn);
  if (daysLeft < 0) return { kind: "expired", daysLeft };
  return { kind: daysLeft <= LICENSE_WARNING_DAYS ? "expiring" : "valid", daysLeft };
}
