import type { Metadata } from "next";
import { Pager } from "@/components/data-table/paged-table";
import { RowAction } from "@/components/form/row-action";
import { PageHeader } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { paths } from "@/lib/domain/shared/paths";
import { listDeadLetters } from "@/lib/services/messages/list-dead-letters";
import { read } from "@/lib/web/page";
import { retryDeadLetterAction } from "../actions";

export const metadata: Metadata = { title: "Failed deliveries" };

export default async function DeliveriesPage({ searchParams }: PageProps<"/settings/deliveries">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listDeadLetters, search);
  return (
    <>
      <PageHeader title="Failed deliveries" note="Tried as often as it makes sense, then given up" />
      {rows.length === 0 && (
        <EmptyState title="None">Everything that had to go out went out, or is still being tried.</EmptyState>
      )}
      {rows.map((letter) => (
        <Card key={letter.id} className="flex flex-wrap items-center justify-between gap-2">
          <div>
            <p className="figures">{letter.event}</p>
            <p className="text-alert">{letter.lastError}</p>
          </div>
          <RowAction action={retryDeadLetterAction} name="outboxId" value={letter.id} button="Try again" />
        </Card>
      ))}
      <Pager path={paths.deliveries} search={search} {...page} />
    </>
  );
}
