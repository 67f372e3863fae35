import type { Metadata } from "next";
import { frame } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { SearchBar } from "@/components/data-table/paged-table";
import { RowAction } from "@/components/form/row-action";
import { PageHeader } from "@/components/layout/page-header";
import { EmptyState } from "@/components/ui/card";
import { paths } from "@/lib/domain/shared/paths";
import { toLocalTime } from "@/lib/domain/shared/zone";
import { listDeadLetters } from "@/lib/services/messages/list-dead-letters";
import { read } from "@/lib/web/page";
import { retryDeadLetterAction } from "../actions";

export const metadata: Metadata = { title: "Failed deliveries" };

export default async function DeliveriesPage({ searchParams }: PageProps<"/settings/deliveries">) {
  const search = await searchParams;
  const list = await read(listDeadLetters, search);
  const { zone } = (await frame()).company;
  const path = paths.deliveries;
  return (
    <>
      <PageHeader title="Failed deliveries" note={`Given up after the last attempt. Times in ${zone}.`} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Failed deliveries"
        rowKey={(letter) => letter.id}
        exportHref={hrefWith(paths.listFile("settings/deliveries"), search, { page: null })}
        filters={<SearchBar path={path} q={String(search.q ?? "")} label="To whom, or why" sort={search.sort} />}
        empty={<EmptyState title="None">Everything that had to go out went out, or is still being tried.</EmptyState>}
        columns={[
          { key: "what", header: "What", sortable: true, cell: ({ what }) => what.replaceAll(/[-.]/g, " ") },
          { key: "to", header: "To", sortable: true, figures: true, cell: (letter) => letter.to },
          {
            key: "at",
            header: "Given up",
            sortable: true,
            figures: true,
            cell: ({ at }) => at && toLocalTime(at, zone).replace("T", " "),
          },
          { key: "attempts", header: "Attempts", figures: true, end: true, cell: (letter) => letter.attempts },
          { key: "why", header: "Why", cell: (letter) => letter.lastError },
          {
            key: "again",
            header: "Again",
            cell: (letter) => (
              <RowAction action={retryDeadLetterAction} name="outboxId" value={letter.id} button="Try again" />
            ),
          },
        ]}
      />
    </>
  );
}
