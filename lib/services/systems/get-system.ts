import { and, count, eq, isNull, max } from "drizzle-orm";
import { sites } from "@/db/schema/sites";
import { matrixVersions, points } from "@/db/schema/systems";
import { calendarDate } from "@/lib/domain/shared/zone";
import { SystemRef } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";
import { query } from "@/lib/services/command";
import { systemById } from "./internal";

/** The head of a system's pages. */
export const getSystem = query({
  name: "system.get",
  needs: "system:read",
  input: SystemRef,
  async run({ tx, now }, { systemId }) {
    const system = await systemById(tx, systemId);
    const [site] = await tx.select().from(sites).where(eq(sites.id, system.siteId));
    if (!site) throw notFound("site");
    const [there] = await tx
      .select({ devices: count() })
      .from(points)
      .where(and(eq(points.systemId, systemId), isNull(points.removedOn)));
    const [matrix] = await tx
      .select({ newest: max(matrixVersions.number) })
      .from(matrixVersions)
      .where(eq(matrixVersions.systemId, systemId));
    return {
      ...system,
      site: { id: site.id, name: site.name, city: site.city, zone: site.zone },
      today: calendarDate(now, site.zone),
      devices: there?.devices ?? 0,
      matrixVersion: matrix?.newest ?? null,
    };
  },
});
