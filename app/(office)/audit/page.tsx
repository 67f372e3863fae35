import type { Metadata } from "next";
import { Pager, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Table, Td, Th } from "@/components/ui/table";
import { paths } from "@/lib/domain/shared/paths";
import { toLocalTime } from "@/lib/domain/shared/zone";
import { listAudit } from "@/lib/services/audit/list-audit";
import { getCompany } from "@/lib/services/company/get-company";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Audit trail" };

export default async function AuditPage({ searchParams }: PageProps<"/audit">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listAudit, search);
  const { zone } = await read(getCompany);
  return (
    <>
      <PageHeader title="Audit trail" note={`Who did what. Times in ${zone}.`} />
      <SearchBar path={paths.audit} q={String(search.q ?? "")} label="Verb" />
      <Table>
        <thead>
          <tr>
            <Th>When</Th>
            <Th>Who</Th>
            <Th>What</Th>
            <Th>Of</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ entry, person }) => (
            <tr key={entry.id}>
              <Td className="figures">{toLocalTime(entry.at, zone).replace("T", " ")}</Td>
              <Td>{person ?? entry.actorKind}</Td>
              <Td className="figures">{entry.command}</Td>
              <Td>{entry.entity}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
      <Pager path={paths.audit} search={search} {...page} />
    </>
  );
}
