import type { Metadata } from "next";
import Link from "next/link";
import { Pager, SearchBar } from "@/components/data-table/paged-table";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/card";
import { Table, Td, Th } from "@/components/ui/table";
import { paths } from "@/lib/domain/shared/paths";
import { ROLE_WORDS } from "@/lib/domain/shared/roles";
import { listPeople } from "@/lib/services/people/list-people";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "People" };

export default async function PeoplePage({ searchParams }: PageProps<"/people">) {
  const search = await searchParams;
  const { rows, ...page } = await read(listPeople, search);
  return (
    <>
      <PageHeader
        title="People"
        actions={
          <Button asChild variant="primary">
            <Link href="/people/new">Invite somebody</Link>
          </Button>
        }
      />
      <SearchBar path={paths.people} q={String(search.q ?? "")} label="Name or e-mail address" />
      {rows.length === 0 && <EmptyState title="Nobody fits" />}
      {rows.length > 0 && (
        <Table>
          <thead>
            <tr>
              <Th>Name</Th>
              <Th>Role</Th>
              <Th>Reach</Th>
              <Th>Licenses</Th>
            </tr>
          </thead>
          <tbody>
            {rows.map((person) => (
              <tr key={person.id}>
                <Td>
                  <Link href={paths.person(person.id)} className="font-semibold hover:underline">
                    {person.name}
                  </Link>
                </Td>
                <Td>{ROLE_WORDS[person.role]}</Td>
                <Td className="figures">{[person.phone, person.email].filter(Boolean).join(" · ")}</Td>
                <Td className="figures">
                  {person.licenses.map((license) => `${license.jurisdiction} ${license.expiresOn}`).join(", ")}
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      <Pager path={paths.people} search={search} {...page} />
    </>
  );
}
