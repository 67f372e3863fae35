import { listAudit } from "@/lib/services/audit/list-audit";
import { listFile } from "@/lib/web/list-file";

export const GET = listFile(listAudit, "audit-trail", [
  ["When (UTC)", ({ entry }) => entry.at.toISOString()],
  ["Who", ({ entry, person }) => person ?? entry.actorKind],
  ["What", ({ entry }) => entry.command],
  ["Of", ({ entry }) => entry.entity],
  ["Identity", ({ entry }) => entry.entityId],
]);
