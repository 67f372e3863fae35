import { v7 as uuidv7 } from "uuid";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { type PartsPlan, planParts, systemsSpokenOf } from "@/lib/domain/imports/plan-parts";
import { type Into, type Places, planPlaces } from "@/lib/domain/imports/plan-places";
import { type Finding, type ReadFile, readFile } from "@/lib/domain/imports/rows";
import type { ImportInput } from "@/lib/domain/imports/schemas";
import { summaryOf } from "@/lib/domain/imports/view";
import { calendarDate } from "@/lib/domain/shared/zone";
import { systemById } from "@/lib/services/systems/internal";
import { knownParts, knownPlaces, rememberedColumns } from "./known";

type Prepared = { files: ReadFile[]; places: Places; parts: PartsPlan; findings: Finding[] };

/** Reads the files and lays out what would become of the company's data; writes nothing. */
export async function prepare(tx: Tx, now: Date, { systemId, files }: z.output<typeof ImportInput>): Promise<Prepared> {
  const into = systemId === null ? null : await intoSystem(tx, systemId);
  const remembered = await rememberedColumns(tx);
  const read = files.map((file) => readFile(file, remembered));
  const lists = read.flatMap(({ part }) => part ?? []);
  const findings = read.flatMap((file) => file.findings);
  const means = {
    into,
    newId: uuidv7,
    say: (finding: Finding) => findings.push(finding),
    todayIn: (zone: string) => calendarDate(now, zone),
  };
  const places = planPlaces(lists, await knownPlaces(tx), means);
  const parts = planParts(lists, places, await knownParts(tx, systemsSpokenOf(lists, places)), means);
  return { files: read, places, parts, findings: inOrder(findings, files) };
}

const intoSystem = async (tx: Tx, systemId: string): Promise<Into> => ({
  systemId,
  siteId: (await systemById(tx, systemId)).siteId,
});

/** As one would go through the files. */
function inOrder(findings: readonly Finding[], files: readonly { name: string }[]): Finding[] {
  const place = new Map(files.map(({ name }, i) => [name, i]));
  return findings.toSorted(
    (a, b) => (place.get(a.file) ?? 0) - (place.get(b.file) ?? 0) || (a.row ?? 0) - (b.row ?? 0),
  );
}

export const summary = ({ places, parts }: Prepared) => summaryOf(places, parts);
export type { Prepared };
