import type { Metadata } from "next";
import Link from "next/link";
import { Pager, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { Table, Td, Th } from "@/components/ui/table";
import { paths } from "@/lib/domain/shared/paths";
import { listCustomers } from "@/lib/services/customers/list-customers";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Customers" };

export default async function CustomersPage({ searchParams }: PageProps<"/customers">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listCustomers, search);
  return (
    <>
      <PageHeader
        title="Customers"
        actions={
          <Button asChild variant="primary">
            <Link href="/customers/new">New customer</Link>
          </Button>
        }
      />
      <SearchBar path={paths.customers} q={String(search.q ?? "")} label="Name or city" />
      {rows.length === 0 && <EmptyState title="No customer fits">Change the search, or add a customer.</EmptyState>}
      {rows.length > 0 && (
        <Table>
          <thead>
            <tr>
              <Th>Name</Th>
              <Th>Telephone</Th>
              <Th>City</Th>
              <Th>Sites</Th>
            </tr>
          </thead>
          <tbody>
            {rows.map((customer) => (
              <tr key={customer.id}>
                <Td>
                  <Link href={paths.customer(customer.id)} className="font-semibold hover:underline">
                    {customer.name}
                  </Link>
                </Td>
                <Td className="figures">{customer.phone}</Td>
                <Td>{customer.billingCity}</Td>
                <Td className="figures">{customer.sites}</Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      <Pager path={paths.customers} search={search} {...page} />
    </>
  );
}
