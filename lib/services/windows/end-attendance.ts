import { attendances } from "@/db/schema/windows";
import { AttendanceRef } from "@/lib/domain/windows/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endAttendance = command({
  name: "window.end-attendance",
  needs: "site:write",
  input: AttendanceRef,
  async run({ tx, now }, { attendanceId }) {
    const siteId = await endEntry(tx, attendances, attendanceId, now, "attendance");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { attendanceId, endedAt: now } } };
  },
});
