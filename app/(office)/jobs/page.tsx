import type { Metadata } from "next";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { FilterSelect, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { JOB_KIND_WORDS, JOB_KINDS } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Jobs" };

const KINDS = JOB_KINDS.map((value) => ({ value, label: JOB_KIND_WORDS[value] }));

export default async function JobsPage({ searchParams }: PageProps<"/jobs">) {
  const search = await searchParams;
  const list = await read(listJobs, search);
  const path = paths.jobs;
  return (
    <>
      <PageHeader title="Jobs" />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Jobs"
        rowKey={(job) => job.id}
        exportHref={hrefWith(paths.listFile("jobs"), search, { page: null })}
        filters={
          <SearchBar path={path} q={String(search.q ?? "")} label="Work or site" sort={search.sort}>
            <FilterSelect name="kind" label="Kind" search={search} options={KINDS} all="Every kind" />
          </SearchBar>
        }
        empty={<EmptyState title="No jobs yet">A job is one piece of work for a site.</EmptyState>}
        columns={[
          { key: "number", header: "Number", sortable: true, figures: true, cell: (job) => job.number },
          { key: "title", header: "What is to be done", sortable: true, cell: (job) => job.title },
          { key: "kind", header: "Kind", sortable: true, cell: (job) => JOB_KIND_WORDS[job.kind] },
          {
            key: "site",
            header: "Site",
            sortable: true,
            cell: ({ site }) => (
              <>
                <TextLink href={paths.site(site.id)}>{site.name}</TextLink>, {site.city}
              </>
            ),
          },
        ]}
      />
    </>
  );
}
