import type { ListName } from "./lists";
import type { PartsPlan } from "./plan-parts";
import type { Places } from "./plan-places";
import type { FileView, Finding } from "./rows";

export type Count = { added: number; changed: number; removed: number; unchanged: number };
export type Counts = Partial<Record<ListName, Count>>;
/** How many came to be proven, and how many systems get a new version of their matrix. */
export type Summary = { counts: Counts; proofs: number; versions: number };

/** What an import would do, and everything that stands against it. */
export type Preview = {
  files: FileView[];
  summary: Summary;
  findings: Finding[];
  /** All of them; the list above ends somewhere. */
  findingCount: number;
};

export type Imported = {
  summary: Summary;
  systems: { id: string; name: string; siteName: string }[];
};

export function summaryOf({ sites, systems }: Places, parts: PartsPlan): Summary {
  const { zones, groups, points, outputs, equipment, matrix, proofs } = parts;
  const changes = { sites, systems, zones, output_groups: groups, points, outputs, equipment };
  const tables = Object.entries(changes).map(([list, { added, changed, unchanged }]) => {
    return [list, { added: added.length, changed: changed.length, removed: 0, unchanged }] as const;
  });
  const sum = (of: (plan: (typeof matrix)[number]) => number) => matrix.reduce((total, plan) => total + of(plan), 0);
  const cells: Count = {
    added: sum(({ added, replaced }) => added.length - replaced),
    changed: sum(({ replaced }) => replaced),
    removed: sum(({ ended, replaced }) => ended.length - replaced),
    unchanged: sum(({ kept }) => kept),
  };
  const counts: Counts = Object.fromEntries(
    [...tables, ["matrix", cells] as const].filter(([, count]) => Object.values(count).some((number) => number > 0)),
  );
  return { counts, proofs: proofs.length, versions: matrix.filter(isChange).length };
}

export const isChange = ({ ended, added }: { ended: readonly unknown[]; added: readonly unknown[] }): boolean =>
  ended.length + added.length > 0;
