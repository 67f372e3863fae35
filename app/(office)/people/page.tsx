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
import { ROLE_WORDS } from "@/lib/domain/shared/roles";
import { listPeople } from "@/lib/services/people/list-people";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "People" };

const ENDED = [{ value: "ended", label: "Whose access ended" }];

export default async function PeoplePage({ searchParams }: PageProps<"/people">) {
  const search = await searchParams;
  const list = await read(listPeople, search);
  const path = paths.people;
  const add = (await may("person:write")) && (
    <Button asChild variant="primary">
      <Link href="/people/new">Invite somebody</Link>
    </Button>
  );
  return (
    <>
      <PageHeader title="People" actions={add} />
      <DataTable
        {...list}
        {...{ path, search }}
        caption="People"
        rowKey={(person) => person.id}
        exportHref={hrefWith(paths.listFile("people"), search, { page: null })}
        filters={
          <SearchBar path={path} q={String(search.q ?? "")} label="Name or e-mail address" sort={search.sort}>
            <FilterSelect name="show" label="Show" search={search} options={ENDED} all="Who works here" />
          </SearchBar>
        }
        empty={<EmptyState title="Nobody yet" action={add} />}
        columns={[
          {
            key: "name",
            header: "Name",
            sortable: true,
            cell: (person) => <TextLink href={paths.person(person.id)}>{person.name}</TextLink>,
          },
          { key: "role", header: "Role", sortable: true, cell: (person) => ROLE_WORDS[person.role] },
          { key: "phone", header: "Telephone", figures: true, cell: (person) => person.phone },
          { key: "email", header: "E-mail address", figures: true, cell: (person) => person.email },
          {
            key: "licenses",
            header: "Licenses",
            figures: true,
            cell: ({ licenses }) => licenses.map((one) => `${one.jurisdiction} ${one.expiresOn}`).join(", "),
          },
        ]}
      />
    </>
  );
}
