import { notFound } from "next/navigation";
import { frame } from "@/app/frame";
import { FindButton } from "@/components/find/find-button";
import { NewCallButton } from "@/components/find/new-call-button";
import type { NavItem } from "@/components/layout/nav-links";
import { Shell } from "@/components/layout/shell";
import { paths } from "@/lib/domain/shared/paths";
import { mayDo } from "@/lib/domain/shared/permissions";
import type { Role } from "@/lib/domain/shared/roles";
import { leaveAction } from "../(public)/actions";

const EVERYONE: readonly NavItem[] = [
  { href: paths.runSheet(), label: "Run sheet" },
  { href: paths.dueList, label: "Due list" },
  { href: paths.jobs, label: "Jobs" },
  { href: paths.sites, label: "Sites" },
  { href: paths.customers, label: "Customers" },
  { href: paths.agreements, label: "Agreements" },
  { href: paths.people, label: "People" },
];

const NAV: Partial<Record<Role, readonly NavItem[]>> = {
  owner: [
    { href: paths.overview, label: "Overview" },
    ...EVERYONE,
    { href: paths.audit, label: "Audit trail" },
    { href: paths.settings, label: "Settings" },
  ],
  dispatcher: EVERYONE,
  bookkeeper: EVERYONE,
};

export default async function OfficeLayout({ children }: LayoutProps<"/">) {
  const { company, role, personName } = await frame();
  const items = NAV[role];
  if (!items) notFound();
  const find = (
    <>
      {mayDo(role, "job:write") && <NewCallButton />}
      <FindButton />
    </>
  );
  return (
    <Shell companyName={company.name} personName={personName} items={items} find={find} leave={leaveAction}>
      {children}
    </Shell>
  );
}
