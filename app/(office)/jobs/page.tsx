import type { Metadata } from "next";
import Link from "next/link";
import { may } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { FilterSelect, SearchBar } from "@/components/data-table/paged-table";
import { JobStateBadge } from "@/components/jobs/job-state-badge";
import { PageHeader } from "@/components/layout/page-header";
import { Badge } from "@/components/ui/badge";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { JOB_STATE_WORDS, JOB_STATES } from "@/lib/domain/jobs/job-state";
import { JOB_KIND_WORDS, JOB_KINDS } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Jobs" };

const STATES = JOB_STATES.map((value) => ({ value, label: JOB_STATE_WORDS[value] }));
const KINDS = JOB_KINDS.map((value) => ({ value, label: JOB_KIND_WORDS[value] }));

export default async function JobsPage({ searchParams }: PageProps<"/jobs">) {
  const search = await searchParams;
  const list = await read(listJobs, search);
  const path = paths.jobs;
  const newCall = (await may("job:write")) && (
    <Button asChild variant="primary">
      <Link href={paths.newJob()}>New call</Link>
    </Button>
  );
  return (
    <>
      <PageHeader title="Jobs" actions={newCall} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Jobs"
        rowKey={(job) => job.id}
        exportHref={hrefWith(paths.listFile("jobs"), search, { page: null })}
        filters={
          <SearchBar path={path} q={String(search.q ?? "")} label="Number, work, site or street" sort={search.sort}>
            {typeof search.site === "string" && <input type="hidden" name="site" value={search.site} />}
            <FilterSelect name="state" label="State" search={search} options={STATES} all="All but canceled" />
            <FilterSelect name="kind" label="Kind" search={search} options={KINDS} all="Every kind" />
          </SearchBar>
        }
        empty={
          <EmptyState title="No jobs yet" action={newCall}>
            A call, a repair, or what is due by an agreement.
          </EmptyState>
        }
        columns={[
          { key: "number", header: "Number", sortable: true, figures: true, cell: (job) => job.number },
          { key: "state", header: "State", sortable: true, cell: (job) => <JobStateBadge state={job.state} /> },
          {
            key: "title",
            header: "What is to be done",
            sortable: true,
            cell: (job) => (
              <>
                <TextLink href={paths.job(job.id)}>{job.title}</TextLink>{" "}
                {job.urgent && <Badge tone="alert">Urgent</Badge>}
              </>
            ),
          },
          { key: "kind", header: "Kind", sortable: true, cell: (job) => JOB_KIND_WORDS[job.kind] },
          {
            key: "site",
            header: "Site",
            sortable: true,
            cell: (job) => (
              <>
                <TextLink href={paths.site(job.site.id)}>{job.site.name}</TextLink>, {job.site.city}
              </>
            ),
          },
          { key: "due", header: "Due by", sortable: true, figures: true, cell: (job) => job.latestOn },
          {
            key: "visit",
            header: "Next visit",
            sortable: true,
            figures: true,
            cell: (job) => job.nextVisit?.replace("T", " "),
          },
        ]}
      />
    </>
  );
}
