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
import { listAgreements } from "@/lib/services/agreements/list-agreements";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Agreements" };

const STANDING = [
  { value: "now", label: "In force" },
  { value: "ended", label: "Ended" },
];

export default async function AgreementsPage({ searchParams }: PageProps<"/agreements">) {
  const search = await searchParams;
  const { today, ...list } = await read(listAgreements, search);
  const path = paths.agreements;
  const add = (await may("agreement:write")) && (
    <Button asChild variant="primary">
      <Link href={paths.newAgreement()}>New agreement</Link>
    </Button>
  );
  return (
    <>
      <PageHeader
        title="Agreements"
        note="Which tests are done where, how often and for how much. What follows from them stands in the due list."
        actions={add}
      />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Agreements"
        rowKey={(agreement) => agreement.id}
        exportHref={hrefWith(paths.listFile("agreements"), search, { page: null })}
        filters={
          <SearchBar path={path} q={String(search.q ?? "")} label="Name, number or customer" sort={search.sort}>
            <FilterSelect name="standing" label="Which" search={search} options={STANDING} all="All" />
          </SearchBar>
        }
        empty={
          <EmptyState title="No agreements yet" action={add}>
            Write down what was agreed with a customer: kind of test, how often, since when.
          </EmptyState>
        }
        columns={[
          { key: "number", header: "Number", sortable: true, figures: true, cell: (one) => one.number },
          {
            key: "name",
            header: "Name",
            sortable: true,
            cell: (one) => <TextLink href={paths.agreement(one.id)}>{one.name}</TextLink>,
          },
          {
            key: "customer",
            header: "Customer",
            sortable: true,
            cell: (one) => <TextLink href={paths.customer(one.customer.id)}>{one.customer.name}</TextLink>,
          },
          { key: "tests", header: "Tests", sortable: true, figures: true, end: true, cell: (one) => one.tests },
          { key: "sites", header: "Sites", sortable: true, figures: true, end: true, cell: (one) => one.sites },
          { key: "first", header: "First day", sortable: true, figures: true, cell: (one) => one.startsOn },
          {
            key: "last",
            header: "Last day",
            sortable: true,
            figures: true,
            cell: (one) => one.endsOn && `${one.endsOn}${one.endsOn < today ? " (ended)" : ""}`,
          },
        ]}
      />
    </>
  );
}
