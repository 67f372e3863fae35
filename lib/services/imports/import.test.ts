import { asc, eq } from "drizzle-orm";
import { beforeAll, expect, test } from "vitest";
import { asActor } from "@/db/door";
import { sites } from "@/db/schema/sites";
import { matrixCells, matrixVersions, outputGroups, points, systems, zones } from "@/db/schema/systems";
import { listAudit } from "@/lib/services/audit/list-audit";
import { getOutputs } from "@/lib/services/systems/get-outputs";
import { listPoints } from "@/lib/services/systems/list-points";
import { removeEntry } from "@/lib/services/systems/remove-entry";
import { rowsSeen } from "@/tests/factories/sight";
import { bareSystem, smallSystem, systemWithMatrix } from "@/tests/factories/systems";
import { newWorld, type World } from "@/tests/factories/world";
import { importLists } from "./import-lists";
import { previewImport } from "./preview-import";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});

const csv = (name: string, ...lines: string[]) => ({ name: `${name}.csv`, content: `${lines.join("\r\n")}\r\n` });

/** A building with a matrix, in all eight lists. */
const wholeBuilding = (site: string) => [
  csv(
    "sites",
    "site,name,kind,street,city,state,postal code,time zone",
    `${site},Hall ${site},hotel,1 ${site} Way,Chicago,IL,60601,America/Chicago`,
  ),
  csv("systems", "site,system,name,maker", `${site},P1,Main panel,Harrow & Vale`),
  csv("zones", "zone,name", "1,Lobby", "2,Attic"),
  csv("output-groups", "group,name,function,last proven,method", "F,Fans,fan_shutdown,2026-03-01,watched"),
  csv(
    "points",
    "address,zone,kind,label,walk order,last proven,method",
    "1-001,1,smoke,Lobby ceiling,1,3/2/2026,canned smoke",
    '1-002,2,Duct detector,"Supply, AHU-1",2,,',
  ),
  csv("outputs", "address,group,label", "R1,F,AHU-1 stop"),
  csv("equipment", "tag,output,kind,action,restart,last proven", "AHU-1,R1,air_handler,stop,at_unit,2026-03-01"),
  csv(
    "matrix",
    "zone,address,group,signal,source,delay seconds",
    "1,,F,alarm,approved_sequence,0",
    ",1-002,F,supervisory,as_found,5",
  ),
];

const run = (files: object[], systemId?: string) => importLists(w.dispatcher.context, { files, systemId });
const look = (files: object[], systemId?: string) => previewImport(w.dispatcher.context, { files, systemId });
const inDatabase = <T>(read: Parameters<typeof asActor<T>>[1]) => asActor(w.owner.actor, read, "read");
const countOf = async (table: string) => (await rowsSeen(w.owner.actor, table)).length;

test("eight lists make a building with its matrix; the same lists again change nothing", async () => {
  const files = wholeBuilding("B1");
  const { systems: touched, summary } = await run(files);
  const systemId = touched[0]?.id ?? "";
  expect(summary).toMatchObject({ proofs: 3, versions: 1, counts: { points: { added: 2 }, matrix: { added: 2 } } });
  const { rows, proofs } = await listPoints(w.owner.context, { systemId });
  expect(rows.map(({ point, zone }) => [point.address, point.kind, point.label, zone?.key])).toEqual([
    ["1-001", "smoke", "Lobby ceiling", "1"],
    ["1-002", "duct", "Supply, AHU-1", "2"],
  ]);
  expect(Object.values(proofs)).toEqual([{ on: "2026-03-02", outcome: "proven", method: "canned smoke" }]);
  const { proofs: behind } = await getOutputs(w.owner.context, { systemId });
  expect(Object.values(behind.groups)).toMatchObject([{ on: "2026-03-01", method: "watched" }]);
  expect(Object.values(behind.equipment)).toHaveLength(1);
  const [version] = await inDatabase((tx) =>
    tx.select().from(matrixVersions).where(eq(matrixVersions.systemId, systemId)),
  );
  expect(version).toMatchObject({ number: 1, note: "Imported", createdBy: w.dispatcher.memberId });

  const tables = [
    "sites",
    "systems",
    "zones",
    "points",
    "output_groups",
    "outputs",
    "equipment",
    "matrix_versions",
    "matrix_cells",
    "proofs",
  ];
  const before = await Promise.all(tables.map((table) => rowsSeen(w.owner.actor, table)));
  const again = await run(files);
  expect(again.systems).toEqual(touched);
  for (const count of Object.values(again.summary.counts))
    expect(count).toMatchObject({ added: 0, changed: 0, removed: 0 });
  expect(again.summary).toMatchObject({ proofs: 0, versions: 0 });
  expect(await Promise.all(tables.map((table) => rowsSeen(w.owner.actor, table)))).toEqual(before);
});

test("a second import updates by the list's own keys; what it does not say stays", async () => {
  const { systemId, pointId, zoneId } = await smallSystem(w);
  await run(
    [csv("points", "address,kind,label,location", "1-001,heat,Lobby heat,Ceiling", "1-003,pull,Stair,")],
    systemId,
  );
  const rows = await inDatabase((tx) =>
    tx.select().from(points).where(eq(points.systemId, systemId)).orderBy(asc(points.address)),
  );
  expect(rows).toMatchObject([
    { id: pointId, address: "1-001", kind: "heat", label: "Lobby heat", location: "Ceiling", zoneId },
    { address: "1-003", kind: "pull", zoneId: null },
  ]);
  await run([csv("points", "address,kind,label,zone", "1-001,heat,Lobby heat,")], systemId);
  const [first] = await inDatabase((tx) => tx.select().from(points).where(eq(points.id, pointId)));
  expect(first).toMatchObject({ location: "Ceiling", zoneId: null });
});

test("a device that was taken off the list and is listed again is back", async () => {
  const { systemId, pointId } = await smallSystem(w);
  await removeEntry(w.owner.context, { systemId, entry: "point", id: pointId, removedOn: "2026-11-01" });
  const { summary } = await run([csv("points", "address,kind,label", "1-001,smoke,Lobby smoke")], systemId);
  expect(summary.counts.points).toMatchObject({ changed: 1 });
  expect((await listPoints(w.owner.context, { systemId })).rows).toHaveLength(1);
});

test("a matrix list is the whole matrix of the systems that it names, in a new version, if anything changed", async () => {
  const { systemId, groupId } = await systemWithMatrix(w);
  const cells = "zone,address,group,signal,source,delay seconds";
  const same = csv("matrix", cells, "1,,F,alarm,approved_sequence,0");
  expect((await run([same], systemId)).summary).toMatchObject({ versions: 0, counts: { matrix: { unchanged: 1 } } });
  const other = csv("matrix", cells, "1,,F,alarm,panel_program,20", ",1-001,F,trouble,as_found,");
  expect((await run([other], systemId)).summary).toMatchObject({
    versions: 1,
    counts: { matrix: { added: 1, changed: 1, removed: 0, unchanged: 0 } },
  });
  const all = await inDatabase((tx) =>
    tx
      .select()
      .from(matrixCells)
      .where(eq(matrixCells.systemId, systemId))
      .orderBy(asc(matrixCells.addedIn), asc(matrixCells.signal)),
  );
  expect(all).toMatchObject([
    { addedIn: 1, removedIn: 2, source: "approved_sequence", groupId },
    { addedIn: 2, removedIn: null, source: "panel_program", delaySeconds: 20 },
    { addedIn: 2, removedIn: null, source: "as_found", signal: "trouble", zoneId: null },
  ]);
});

test("a site that was typed in takes the key of the list, and is not made again", async () => {
  const [site] = await inDatabase((tx) => tx.select().from(sites).where(eq(sites.id, w.site.siteId)));
  const line = [
    `K-${w.site.siteId}`,
    site?.name,
    "school",
    site?.street,
    site?.city,
    site?.state,
    site?.postalCode,
    site?.zone,
  ];
  const list = csv("sites", "site,name,kind,street,city,state,zip,time zone", line.join(","));
  expect((await run([list])).summary.counts.sites).toMatchObject({ added: 0, changed: 1 });
  const other = csv("sites", "site,name,kind,street,city,state,zip,time zone", line.with(0, "another key").join(","));
  expect((await look([other])).findings).toMatchObject([{ row: 2, column: "site", value: "another key" }]);
});

test("a bad row 19,999 leaves nothing behind", { timeout: 60_000 }, async () => {
  const tables = ["points", "zones", "systems", "sites", "audit_entries", "column_matches"];
  const before = await Promise.all(tables.map(countOf));
  const lines = Array.from({ length: 20_000 }, (_, i) => `1-${i},${i === 19_998 ? "9" : "1"},smoke,Device ${i}`);
  const files = [
    ...wholeBuilding("Big").slice(0, 3),
    csv("points", "Address,Zone No.,Device type,Description", ...lines),
  ];
  await expect(run(files)).rejects.toMatchObject({
    code: "invalid",
    message: expect.stringContaining("Nothing was imported"),
  });
  expect((await look(files)).findings).toEqual([
    {
      file: "points.csv",
      list: "points",
      row: 20_000,
      column: "zone",
      message: "There is no such zone in this system",
      value: "9",
    },
  ]);
  expect(await Promise.all(tables.map(countOf))).toEqual(before);
});

test("an import that breaks off after thousands of rows leaves nothing behind", { timeout: 60_000 }, async () => {
  const before = await countOf("points");
  const lines = Array.from({ length: 20_000 }, (_, i) => `2-${i},1,smoke,Device ${i}`);
  const files = [...wholeBuilding("Cut").slice(0, 3), csv("points", "address,zone,kind,label", ...lines)];
  let reached = 0;
  const progress = ({ done }: { done: number }) => {
    reached = done;
    if (done > 19_000) throw new Error("the connection is gone");
  };
  await expect(importLists({ ...w.dispatcher.context, progress }, { files })).rejects.toThrow("the connection is gone");
  expect(reached).toBeGreaterThan(19_000);
  expect(await countOf("points")).toBe(before);
});

test("what only the database refuses leaves nothing behind either", async () => {
  const before = await countOf("points");
  const [a, b] = ["X1", "X2"].map((key) => `${key},Twin,other,7 Twin Street,Chicago,IL,60601,America/Chicago`);
  const files = [
    csv("sites", "site,name,kind,street,city,state,postal code,time zone", a ?? "", b ?? ""),
    csv("systems", "site,system,name", "X1,P,Panel"),
    csv("points", "address,kind,label", "1,smoke,One"),
  ];
  await expect(run(files)).rejects.toMatchObject({ code: "conflict" });
  expect(await countOf("points")).toBe(before);
});

test("columns that were matched by hand, or left out, are remembered for the next list", async () => {
  const systemId = await bareSystem(w);
  const list = (address: string) => csv("points", "Melder,Art,label,location", `${address},smoke,Flur,nicht hier`);
  const columns = { 0: "address", 1: "kind", 3: null };
  await run([{ ...list("7"), list: "points", columns }], systemId);
  const { files, findings } = await look([{ ...list("8") }], systemId);
  expect(findings).toEqual([]);
  expect(files[0]?.columns.map(({ column, how }) => [column, how])).toEqual([
    ["address", "remembered"],
    ["kind", "remembered"],
    ["label", "exact"],
    ["location", "exact"],
  ]);
});

test("what was imported stands in the audit trail, by the import and by the system", async () => {
  const systemId = await bareSystem(w);
  await run([csv("points", "address,kind,label", "1,smoke,One")], systemId);
  const { rows } = await listAudit(w.owner.context, { q: "system.import" });
  expect(rows.map(({ entry }) => entry.entity)).toContain("import");
  expect(rows.some(({ entry }) => entry.entity === "system" && entry.entityId === systemId)).toBe(true);
});

test("two imports of the same new building at once make it once", async () => {
  const files = wholeBuilding("Twice");
  const [a, b] = await Promise.all([run(files), run(files)]);
  expect(a.systems).toEqual(b.systems);
  const made = await inDatabase((tx) =>
    tx
      .select()
      .from(systems)
      .where(eq(systems.id, a.systems[0]?.id ?? "")),
  );
  expect(made).toHaveLength(1);
});

test("rows of several systems find theirs by site and system", async () => {
  const files = [
    csv("systems", "site,system,name", "M1,A,Panel A", "M1,B,Panel B"),
    csv("zones", "site,system,zone,name", "M1,A,1,Zone of A", "M1,B,1,Zone of B"),
    csv("output-groups", "system,group,name,function", "A,F,Fans,fan_shutdown"),
    ...wholeBuilding("M1").slice(0, 1),
  ];
  expect((await run(files)).systems).toHaveLength(2);
  const found = await inDatabase((tx) =>
    tx
      .select({ system: systems.key, zone: zones.name, group: outputGroups.key })
      .from(systems)
      .innerJoin(zones, eq(zones.systemId, systems.id))
      .leftJoin(outputGroups, eq(outputGroups.systemId, systems.id))
      .innerJoin(sites, eq(sites.id, systems.siteId))
      .where(eq(sites.key, "M1"))
      .orderBy(asc(systems.key)),
  );
  expect(found).toEqual([
    { system: "A", zone: "Zone of A", group: "F" },
    { system: "B", zone: "Zone of B", group: null },
  ]);
});
