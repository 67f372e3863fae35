import type { Metadata } from "next";
import Link from "next/link";
import { Pager, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { Table, Td, Th } from "@/components/ui/table";
import { paths } from "@/lib/domain/shared/paths";
import { SITE_KIND_WORDS } from "@/lib/domain/sites/words";
import { listSites } from "@/lib/services/sites/list-sites";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Sites" };

export default async function SitesPage({ searchParams }: PageProps<"/sites">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listSites, search);
  return (
    <>
      <PageHeader
        title="Sites"
        actions={
          <Button asChild variant="primary">
            <Link href="/sites/new">New site</Link>
          </Button>
        }
      />
      <SearchBar path={paths.sites} q={String(search.q ?? "")} label="Name, street or city" />
      {rows.length === 0 && <EmptyState title="No site fits">Change the search, or add a site.</EmptyState>}
      {rows.length > 0 && (
        <Table>
          <thead>
            <tr>
              <Th>Name</Th>
              <Th>Kind</Th>
              <Th>Address</Th>
            </tr>
          </thead>
          <tbody>
            {rows.map((site) => (
              <tr key={site.id}>
                <Td>
                  <Link href={paths.site(site.id)} className="font-semibold hover:underline">
                    {site.name}
                  </Link>
                </Td>
                <Td>{SITE_KIND_WORDS[site.kind]}</Td>
                <Td>
                  {site.street}, {site.city}
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      <Pager path={paths.sites} search={search} {...page} />
    </>
  );
}
