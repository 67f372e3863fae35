import type { Metadata } from "next";
import Link from "next/link";
import { Pager, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { EmptyState } from "@/components/ui/card";
import { Table, Td, Th } from "@/components/ui/table";
import { JOB_KIND_WORDS } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { listJobs } from "@/lib/services/jobs/list-jobs";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Jobs" };

export default async function JobsPage({ searchParams }: PageProps<"/jobs">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listJobs, search);
  return (
    <>
      <PageHeader title="Jobs" />
      <SearchBar path={paths.jobs} q={String(search.q ?? "")} label="Work or site" />
      {rows.length === 0 && <EmptyState title="No job fits" />}
      {rows.length > 0 && (
        <Table>
          <thead>
            <tr>
              <Th>Number</Th>
              <Th>Kind</Th>
              <Th>What is to be done</Th>
              <Th>Site</Th>
            </tr>
          </thead>
          <tbody>
            {rows.map((job) => (
              <tr key={job.id}>
                <Td className="figures">{job.number}</Td>
                <Td>{JOB_KIND_WORDS[job.kind]}</Td>
                <Td>{job.title}</Td>
                <Td>
                  <Link href={paths.site(job.site.id)} className="font-semibold hover:underline">
                    {job.site.name}
                  </Link>
                  , {job.site.city}
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      <Pager path={paths.jobs} search={search} {...page} />
    </>
  );
}
