import { and, asc, eq, sql } from "drizzle-orm";
import type { AnyPgColumn, PgTable } from "drizzle-orm/pg-core";
import type { Tx } from "@/db/client";
import { equipment, outputGroups, outputs, points, systems, zones } from "@/db/schema/systems";
import type { REMOVABLE } from "@/lib/domain/systems/schemas";
import { notFound } from "@/lib/errors";

export async function systemById(tx: Tx, systemId: string) {
  const [system] = await tx.select().from(systems).where(eq(systems.id, systemId));
  if (!system) throw notFound("system");
  return system;
}

/** Device 10 after device 9 (collation of migration 0007). */
export const naturally = (column: AnyPgColumn) => sql`${column} collate natural_order`;

/** The parts of a device list that stand above the devices. */
export async function partsOf(tx: Tx, systemId: string) {
  return {
    zones: await tx.select().from(zones).where(eq(zones.systemId, systemId)).orderBy(naturally(zones.key)),
    groups: await tx
      .select()
      .from(outputGroups)
      .where(eq(outputGroups.systemId, systemId))
      .orderBy(naturally(outputGroups.key)),
    outputs: await tx
      .select()
      .from(outputs)
      .where(eq(outputs.systemId, systemId))
      .orderBy(naturally(outputs.address), asc(outputs.id)),
    equipment: await tx
      .select()
      .from(equipment)
      .where(eq(equipment.systemId, systemId))
      .orderBy(naturally(equipment.tag), asc(equipment.id)),
  };
}

export const pointsOf = (tx: Tx, systemId: string) =>
  tx.select().from(points).where(eq(points.systemId, systemId)).orderBy(naturally(points.address));

type Kept = PgTable & { id: AnyPgColumn; systemId: AnyPgColumn };
const REMOVABLE_TABLES: Record<(typeof REMOVABLE)[number], Kept> = { point: points, output: outputs, equipment };

/** Takes an entry off the list, or puts it back; what was proven of it stays either way. */
export async function setRemoved(
  tx: Tx,
  {
    systemId,
    entry,
    id,
    removedOn,
  }: { systemId: string; entry: (typeof REMOVABLE)[number]; id: string; removedOn: string | null },
): Promise<void> {
  const table = REMOVABLE_TABLES[entry];
  const changed = await tx.execute(
    sql`update ${table} set removed_on = ${removedOn} where ${and(eq(table.id, id), eq(table.systemId, systemId))} returning 1`,
  );
  if (changed.length === 0) throw notFound(entry);
}
