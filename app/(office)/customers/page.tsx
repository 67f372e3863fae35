import type { Metadata } from "next";
import Link from "next/link";
import { may } from "@/app/frame";
import { hrefWith } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { listCustomers } from "@/lib/services/customers/list-customers";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Customers" };

export default async function CustomersPage({ searchParams }: PageProps<"/customers">) {
  const search = await searchParams;
  const list = await read(listCustomers, search);
  const path = paths.customers;
  const add = (await may("customer:write")) && (
    <Button asChild variant="primary">
      <Link href="/customers/new">New customer</Link>
    </Button>
  );
  return (
    <>
      <PageHeader title="Customers" actions={add} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="Customers"
        rowKey={(customer) => customer.id}
        exportHref={hrefWith(paths.listFile("customers"), search, { page: null })}
        filters={<SearchBar path={path} q={String(search.q ?? "")} label="Name or city" sort={search.sort} />}
        empty={
          <EmptyState title="No customers yet" action={add}>
            A customer is who is billed.
          </EmptyState>
        }
        columns={[
          {
            key: "name",
            header: "Name",
            sortable: true,
            cell: (customer) => <TextLink href={paths.customer(customer.id)}>{customer.name}</TextLink>,
          },
          { key: "phone", header: "Telephone", figures: true, cell: (customer) => customer.phone },
          { key: "city", header: "City", sortable: true, cell: (customer) => customer.billingCity },
          {
            key: "sites",
            header: "Sites",
            sortable: true,
            figures: true,
            end: true,
            cell: (customer) => customer.sites,
          },
        ]}
      />
    </>
  );
}
