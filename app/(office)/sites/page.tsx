import type { Metadata } from "next";
import Link from "next/link";
import { may } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { FilterSelect, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { SITE_KIND_WORDS, SITE_KINDS } from "@/lib/domain/sites/words";
import { listSites } from "@/lib/services/sites/list-sites";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Sites" };

const KINDS = SITE_KINDS.map((value) => ({ value, label: SITE_KIND_WORDS[value] }));

export default async function SitesPage({ searchParams }: PageProps<"/sites">) {
  const search = await searchParams;
  const list = await read(listSites, search);
  const path = paths.sites;
  const add = (await may("site:write")) && (
    <Button asChild variant="primary">
      <Link href="/sites/new">New site</Link>
    </Button>
  );
  return (
    <>
      <PageHeader title="Sites" actions={add} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Sites"
        rowKey={(site) => site.id}
        exportHref={hrefWith(paths.listFile("sites"), search, { page: null })}
        filters={
          <SearchBar path={path} q={String(search.q ?? "")} label="Name, street or city" sort={search.sort}>
            <FilterSelect name="kind" label="Kind" search={search} options={KINDS} all="Every kind" />
          </SearchBar>
        }
        empty={
          <EmptyState title="No sites yet" action={add}>
            A site is a building or premises where you test.
          </EmptyState>
        }
        columns={[
          {
            key: "name",
            header: "Name",
            sortable: true,
            cell: (site) => <TextLink href={paths.site(site.id)}>{site.name}</TextLink>,
          },
          { key: "kind", header: "Kind", sortable: true, cell: (site) => SITE_KIND_WORDS[site.kind] },
          { key: "street", header: "Street", cell: (site) => site.street },
          { key: "city", header: "City", sortable: true, cell: (site) => `${site.city}, ${site.state}` },
        ]}
      />
    </>
  );
}
