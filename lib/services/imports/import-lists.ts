import { sql } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import type { Tx } from "@/db/client";
import { proofs } from "@/db/schema/proofs";
import { sites } from "@/db/schema/sites";
import {
  columnMatches,
  equipment,
  matrixCells,
  matrixVersions,
  outputGroups,
  outputs,
  points,
  systems,
  zones,
} from "@/db/schema/systems";
import type { Entered } from "@/lib/auth/actor";
import { plainHeading } from "@/lib/domain/imports/match";
import type { MatrixPlan } from "@/lib/domain/imports/plan-matrix";
import type { FileView } from "@/lib/domain/imports/rows";
import { ImportInput } from "@/lib/domain/imports/schemas";
import { type Imported, isChange } from "@/lib/domain/imports/view";
import { AppError } from "@/lib/errors";
import { command, type Inside } from "@/lib/services/command";
import { type Prepared, prepare, summary } from "./prepare";
import { addRows, changeRows } from "./write-rows";

/** The lists become the company's data, all of them or nothing; what is the same already stays untouched. */
export const importLists = command({
  name: "system.import",
  needs: "system:write",
  input: ImportInput,
  async run(inside, input) {
    const { tx, who, now } = inside;
    if (who.kind !== "person") throw new AppError("forbidden", "Only people import lists");
    // Two imports of a company at once would both find the same rows missing.
    await tx.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`import ${who.companyId}`}, 0))`);
    inside.progress({ step: "Reading the lists", done: 0, of: input.files.length });
    const prepared = await prepare(tx, now, input);
    mustBeClean(prepared);
    await write(inside, prepared);
    await saveVersions(inside, who, prepared.parts.matrix.filter(isChange));
    await rememberColumns(tx, who, prepared.files);
    const imported: Imported = { summary: summary(prepared), systems: systemsOf(prepared) };
    const files = input.files.map(({ name }) => name);
    const changes = { files, ...imported.summary };
    return {
      result: imported,
      audit: [
        { entity: "import", entityId: uuidv7(), after: changes },
        ...imported.systems.map(({ id }) => ({ entity: "system", entityId: id, after: changes })),
      ],
    };
  },
});

/** The preview tells them all. */
const MOST_TOLD = 100;

function mustBeClean({ findings }: Prepared): void {
  if (findings.length === 0) return;
  const places = findings
    .slice(0, MOST_TOLD)
    .map(({ file, row, column, message }) => [
      [file, row, column].filter((part) => part !== null).join(", "),
      [message],
    ]);
  const many = findings.length === 1 ? "One entry needs" : `${findings.length} entries need`;
  throw new AppError("invalid", `${many} another look. Nothing was imported`, Object.fromEntries(places));
}

/** In this order, so that nothing points at what is not there yet. */
async function write({ tx, who, progress }: Inside, { places, parts }: Prepared): Promise<void> {
  const tables = [
    { table: sites, title: "Sites", plan: places.sites },
    { table: systems, title: "Systems", plan: places.systems },
    { table: zones, title: "Zones", plan: parts.zones },
    { table: outputGroups, title: "Output groups", plan: parts.groups },
    { table: points, title: "Points", plan: parts.points },
    { table: outputs, title: "Outputs", plan: parts.outputs },
    { table: equipment, title: "Equipment", plan: parts.equipment },
    { table: proofs, title: "Last proofs", plan: { added: parts.proofs.map(asProof), changed: [] } },
  ];
  const of = tables.reduce((sum, { plan }) => sum + plan.added.length + plan.changed.length, 0);
  let done = 0;
  for (const { table, title, plan } of tables) {
    const wrote = (rows: number) => {
      done += rows;
      progress({ step: title, done, of });
    };
    const target = { tx, companyId: who.companyId, table, wrote };
    await addRows(target, plan.added);
    await changeRows(target, plan.changed);
  }
}

const asProof = <P extends object>(proof: P) => ({ ...proof, outcome: "proven" });

type Person = Extract<Entered, { kind: "person" }>;

async function saveVersions({ tx, now, progress }: Inside, who: Person, plans: readonly MatrixPlan[]): Promise<void> {
  if (plans.length === 0) return;
  const { companyId } = who;
  await tx.insert(matrixVersions).values(
    plans.map(({ systemId, number }) => {
      return { companyId, systemId, number, note: "Imported", createdAt: now, createdBy: who.memberId };
    }),
  );
  const ended = plans.flatMap((plan) => plan.ended.map(({ id }) => ({ id, removedIn: plan.number })));
  const added = plans.flatMap(({ systemId, number, added: cells }) =>
    cells.map((cell) => ({ ...cell, systemId, addedIn: number })),
  );
  let done = 0;
  const wrote = (rows: number) => {
    done += rows;
    progress({ step: "Matrix", done, of: ended.length + added.length });
  };
  const target = { tx, companyId, table: matrixCells, wrote };
  await changeRows(target, ended);
  await addRows(target, added);
}

/** What was not plain from the heading itself is remembered for the next list of theirs; left out counts too. */
async function rememberColumns(tx: Tx, who: Entered, files: readonly { view: FileView }[]): Promise<void> {
  const matches = files.flatMap(({ view: { list, columns } }) =>
    columns.flatMap(({ heading, column, how }) => {
      const plain = plainHeading(heading);
      const told = list !== null && plain !== "" && (how === "chosen" || how === "similar");
      return told ? [[`${list} ${plain}`, { list, heading: plain, column: column ?? "" }] as const] : [];
    }),
  );
  const rows = [...new Map(matches).values()].map((match) => ({ ...match, companyId: who.companyId }));
  if (rows.length === 0) return;
  await tx
    .insert(columnMatches)
    .values(rows)
    .onConflictDoUpdate({
      target: [columnMatches.companyId, columnMatches.list, columnMatches.heading],
      set: { column: sql`excluded."column"` },
    });
}

/** Every system that the lists speak of, whether or not anything changed there. */
function systemsOf({ files, places }: Prepared): Imported["systems"] {
  const spoken = new Set(
    files
      .flatMap(({ part }) => part ?? [])
      .flatMap(({ list, rows }) => {
        if (list === "sites") return [];
        return rows.flatMap((row) => places.systemOf(list, row)?.id ?? []);
      }),
  );
  return [...spoken].flatMap((id) => {
    const system = places.systemById.get(id);
    const site = system && places.siteById.get(system.siteId);
    return system && site ? [{ id, name: system.name, siteName: site.name }] : [];
  });
}
