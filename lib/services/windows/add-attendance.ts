import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { contacts } from "@/db/schema/customers";
import { attendances } from "@/db/schema/windows";
import { AttendanceInput } from "@/lib/domain/windows/schemas";
import { notFound } from "@/lib/errors";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addAttendance = command({
  name: "window.add-attendance",
  needs: "site:write",
  input: AttendanceInput,
  async run({ tx, who }, attendance) {
    await siteById(tx, attendance.siteId);
    if (attendance.contactId) {
      const [contact] = await tx.select().from(contacts).where(eq(contacts.id, attendance.contactId));
      if (!contact) throw notFound("contact");
    }
    const id = uuidv7();
    await tx.insert(attendances).values({ ...attendance, id, companyId: who.companyId });
    return { result: { attendanceId: id }, audit: { entity: "site", entityId: attendance.siteId, after: attendance } };
  },
});
