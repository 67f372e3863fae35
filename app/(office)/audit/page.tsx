import type { Metadata } from "next";
import { frame } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { toLocalTime } from "@/lib/domain/shared/zone";
import { listAudit } from "@/lib/services/audit/list-audit";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Audit trail" };

export default async function AuditPage({ searchParams }: PageProps<"/audit">) {
  const search = await searchParams;
  const list = await read(listAudit, search);
  const { zone } = (await frame()).company;
  const path = paths.audit;
  return (
    <>
      <PageHeader title="Audit trail" note={`Who did what. Times in ${zone}.`} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Audit entries"
        rowKey={({ entry }) => entry.id}
        exportHref={hrefWith(paths.listFile("audit"), search, { page: null })}
        filters={<SearchBar path={path} q={String(search.q ?? "")} label="Verb" sort={search.sort} />}
        empty={<EmptyState title="Nothing has happened yet" />}
        columns={[
          {
            key: "at",
            header: "When",
            sortable: true,
            figures: true,
            cell: ({ entry }) => toLocalTime(entry.at, zone).replace("T", " "),
          },
          { key: "who", header: "Who", cell: ({ entry, person }) => person ?? entry.actorKind },
          { key: "what", header: "What", figures: true, cell: ({ entry }) => entry.command },
          {
            key: "of",
            header: "Of",
            cell: ({ entry }) => <Entity {...entry} />,
          },
        ]}
      />
    </>
  );
}

const PAGE_OF: Record<string, (id: string) => string> = {
  customer: paths.customer,
  person: paths.person,
  site: paths.site,
};

function Entity({ entity, entityId }: { entity: string; entityId: string | null }) {
  const page = PAGE_OF[entity];
  return page && entityId ? <TextLink href={page(entityId)}>{entity}</TextLink> : entity;
}
