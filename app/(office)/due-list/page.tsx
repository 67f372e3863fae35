import type { Metadata } from "next";
import Link from "next/link";
import { may } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { CountTabs } from "@/components/data-table/count-tabs";
import { DataTable } from "@/components/data-table/data-table";
import { DueFilters } from "@/components/data-table/due-filters";
import { RowAction } from "@/components/form/row-action";
import { Obstacles } from "@/components/jobs/obstacles";
import { DueBadge } from "@/components/layout/due-badge";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { DUE_STATES } from "@/lib/domain/agreements/due-window";
import { DUE_STATE_WORDS, leftWords } from "@/lib/domain/agreements/due-words";
import { FREQUENCY_WORDS, TEST_KIND_WORDS } from "@/lib/domain/agreements/words";
import { paths } from "@/lib/domain/shared/paths";
import { listDue } from "@/lib/services/jobs/list-due";
import { read } from "@/lib/web/page";
import { makeDueAction } from "./actions";

export const metadata: Metadata = { title: "Due list" };

export default async function DueListPage({ searchParams }: PageProps<"/due-list">) {
  const search = await searchParams;
  const { counts, states, cities, ...list } = await read(listDue, search);
  const mayMakeJobs = await may("job:write");
  const mayAgree = await may("agreement:write");
  const path = paths.dueList;
  const tab = (when: string | null) => hrefWith(path, search, { when, page: null });
  return (
    <>
      <PageHeader
        title="Due list"
        note="The next occurrence of every agreed test, by the dates at its site. Too early is a miss, too."
      />
      <CountTabs
        label="When"
        tabs={[
          { href: tab(null), label: "All", here: !search.when },
          ...DUE_STATES.map((when) => ({
            href: tab(when),
            label: DUE_STATE_WORDS[when],
            count: counts[when],
            here: search.when === when,
          })),
        ]}
      />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="What is due"
        rowKey={(row) => row.item.id}
        exportHref={hrefWith(paths.listFile("due-list"), search, { page: null })}
        filters={<DueFilters {...{ path, search, states, cities }} />}
        empty={
          <EmptyState
            title="No tests are agreed yet"
            action={
              mayAgree && (
                <Button asChild variant="primary">
                  <Link href={paths.newAgreement()}>New agreement</Link>
                </Button>
              )
            }
          >
            Write down what was agreed with a customer: kind of test, how often, since when. What is due follows from
            it.
          </EmptyState>
        }
        columns={[
          {
            key: "test",
            header: "Test",
            sortable: true,
            cell: (row) => (
              <>
                <TextLink href={paths.agreement(row.agreement.id)}>{TEST_KIND_WORDS[row.item.testKind]}</TextLink>
                <span className="block text-sm text-muted">{FREQUENCY_WORDS[row.item.frequency]}</span>
              </>
            ),
          },
          {
            key: "site",
            header: "Site",
            sortable: true,
            cell: (row) => (
              <>
                <TextLink href={paths.site(row.site.id)}>{row.site.name}</TextLink>
                <span className="block text-sm text-muted">
                  {row.site.city}, {row.site.state} · {row.customer.name}
                </span>
              </>
            ),
          },
          ...(["earliest", "target", "latest"] as const).map((key) => ({
            key,
            header: key === "earliest" ? "Earliest" : key === "target" ? "Target" : "Latest",
            sortable: true,
            figures: true,
            cell: (row: (typeof list.rows)[number]) => (
              <span title={row.reckoning} className="whitespace-nowrap">
                {row.window[key]}
              </span>
            ),
          })),
          {
            key: "left",
            header: "Left",
            cell: (row) => (
              <>
                <DueBadge state={row.state} />
                <span className="figures block text-sm whitespace-nowrap">
                  {leftWords(row.state, row.daysLeft, row.untilOpen)}
                </span>
              </>
            ),
          },
          { key: "way", header: "In the way", cell: (row) => <Obstacles obstacles={row.obstacles} /> },
          {
            key: "job",
            header: "Job",
            cell: (row) =>
              row.job ? (
                <TextLink href={paths.job(row.job.id)} className="whitespace-nowrap">
                  Job {row.job.number}
                </TextLink>
              ) : (
                mayMakeJobs && (
                  <span className="whitespace-nowrap">
                    <RowAction action={makeDueAction} name="itemId" value={row.item.id} button="Make the job" />
                  </span>
                )
              ),
          },
        ]}
      />
    </>
  );
}
