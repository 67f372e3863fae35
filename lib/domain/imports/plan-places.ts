import { grouped } from "@/lib/domain/shared/grouped";
import type { KnownPlaces, SiteRow, SystemRow } from "./known";
import type { ListName } from "./lists";
import { ALWAYS, type Change, findingAt, planTable, rowsOf } from "./plan-table";
import type { Finding, Part } from "./rows";

export type Into = { siteId: string; systemId: string } | null;
/** The system that a row belongs to; none where that is unknown, which has been said. */
export type SystemOf = (list: ListName, row: AnyRow) => SystemRow | null;
type AnyRow = { file: string; row: number; values: object };

export type Places = {
  sites: Change<SiteRow>;
  systems: Change<SystemRow>;
  siteById: ReadonlyMap<string, SiteRow>;
  systemById: ReadonlyMap<string, SystemRow>;
  systemOf: SystemOf;
};

type Means = { into: Into; newId: () => string; say: (finding: Finding) => void };

const placeOf = ({ name, street, city, state }: Omit<SiteRow, "id">) => JSON.stringify([name, street, city, state]);
export const within = (parentId: string, key: string): string => `${parentId}/${key}`;

/** Sites and systems, and how the other lists' rows find theirs. */
export function planPlaces(parts: readonly Part[], known: KnownPlaces, means: Means): Places {
  const sites = planSites(parts, known, means);
  const siteById = new Map([...known.sites, ...sites.added, ...sites.changed].map((site) => [site.id, site]));
  // Where a list of places has one row, the others need not name it.
  const listed = rowsOf(parts, "sites").map(({ row }) => sites.byKey.get(row.values.site)?.id);
  const soleSite = means.into?.siteId ?? (listed.length === 1 ? listed[0] : undefined);
  const named: string[] = [];
  const systems = planTable<"systems", SystemRow>({
    ...means,
    list: "systems",
    ownKey: "system",
    parts,
    stored: known.systems,
    keyOf: ({ siteId, key }) => within(siteId, key),
    rowOf: ({ file, row, values: { site, system: key, ...facts } }) => {
      const siteId = site === null ? soleSite : sites.byKey.get(site ?? "")?.id;
      if (siteId) named.push(within(siteId, key));
      if (siteId) return { ...facts, siteId, key };
      if (site !== undefined) means.say(findingAt("systems", { file, row }, "site", siteUnknown(site), site));
      return null;
    },
    fields: { name: "name", maker: "maker", model: "model", location: "location" },
  });
  const systemById = new Map([...known.systems, ...systems.added, ...systems.changed].map((one) => [one.id, one]));
  const sole = means.into
    ? systemById.get(means.into.systemId)
    : named.length === 1
      ? systems.byKey.get(named[0] ?? "")
      : undefined;
  return { sites, systems, siteById, systemById, systemOf: finder(sites.byKey, systems.byKey, sole, means.say) };
}

const siteUnknown = (key: string | null) =>
  key === null ? "Which site? Name it by its key" : "There is no such site in these lists or among yours";

function planSites(parts: readonly Part[], known: KnownPlaces, { newId, say }: Means) {
  const byPlace = new Map(known.sites.map((site) => [placeOf(site), site]));
  return planTable<"sites", SiteRow>({
    list: "sites",
    ownKey: "site",
    parts,
    stored: known.sites.filter(({ key }) => key !== null),
    keyOf: ({ key }) => key ?? "",
    rowOf: ({ values: { site: key, ...facts } }) => ({ ...facts, key }),
    // A site that was typed in has no key yet: the list gives it one.
    adopt: (fresh, row) => {
      const there = byPlace.get(placeOf(fresh));
      if (there?.key)
        say(findingAt("sites", row, "site", `That site is yours already, with the key “${there.key}”`, fresh.key));
      return there ?? null;
    },
    fields: {
      key: ALWAYS,
      name: "name",
      kind: "kind",
      street: "street",
      city: "city",
      state: "state",
      postalCode: "postalCode",
      zone: "zone",
      latitude: "latitude",
      longitude: "longitude",
      authorityName: "authorityName",
      authorityPhone: "authorityPhone",
    },
    newId,
    say,
  });
}

function finder(
  sites: ReadonlyMap<string, SiteRow>,
  systems: ReadonlyMap<string, SystemRow>,
  sole: SystemRow | undefined,
  say: Means["say"],
): SystemOf {
  const byKey = grouped([...systems.values()], ({ key }) => key);
  const find: SystemOf = (list, { file, row, values }) => {
    const { site, system } = values as { site: string | null | undefined; system: string | null | undefined };
    if (site === undefined || system === undefined) return null;
    const refuse = (column: "site" | "system", message: string) => {
      say(findingAt(list, { file, row }, column, message, column === "site" ? site : system));
      return null;
    };
    const siteId = site === null ? undefined : sites.get(site)?.id;
    if (site !== null && !siteId) return refuse("site", siteUnknown(site));
    if (system === null) {
      if (sole && (!siteId || sole.siteId === siteId)) return sole;
      return refuse("system", "Which system? Name it by its key, or start from the system’s own page");
    }
    const candidates = (byKey.get(system) ?? []).filter((one) => !siteId || one.siteId === siteId);
    const [only, ...others] = sole && candidates.includes(sole) ? [sole] : candidates;
    if (only && others.length === 0) return only;
    return only
      ? refuse("site", "More than one site has a system of that key: name the site")
      : refuse("system", "There is no such system in these lists or among yours");
  };
  // Asked several times for a row, answered and refused once.
  const answers = new Map<AnyRow, SystemRow | null>();
  return (list, row) => {
    const known = answers.get(row);
    if (known !== undefined) return known;
    const answer = find(list, row);
    answers.set(row, answer);
    return answer;
  };
}
