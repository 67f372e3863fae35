import { notFound } from "next/navigation";
import { frame } from "@/app/frame";
import { FindButton } from "@/components/find/find-button";
import { NewCallButton } from "@/components/find/new-call-button";
import type { NavItem } from "@/components/layout/nav-links";
import { OfficeShell } from "@/components/layout/office-shell";
import { paths } from "@/lib/domain/shared/paths";
import { mayDo } from "@/lib/domain/shared/permissions";
import type { Role } from "@/lib/domain/shared/roles";
import { leaveAction } from "../(public)/actions";

const EVERYONE: readonly NavItem[] = [
  { href: paths.runSheet(), label: "Run sheet", icon: "columns" },
  { href: paths.dueList, label: "Due list", icon: "clock" },
  { href: paths.jobs, label: "Jobs", icon: "briefcase" },
  { href: paths.sites, label: "Sites", icon: "building" },
  { href: paths.customers, label: "Customers", icon: "people" },
  { href: paths.agreements, label: "Agreements", icon: "paper" },
  { href: paths.people, label: "People", icon: "person" },
];

const NAV: Partial<Record<Role, readonly NavItem[]>> = {
  owner: [
    { href: paths.overview, label: "Overview", icon: "chart" },
    ...EVERYONE,
    { href: paths.audit, label: "Audit trail", icon: "history" },
    { href: paths.settings, label: "Settings", icon: "settings" },
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
    <OfficeShell companyName={company.name} personName={personName} items={items} find={find} leave={leaveAction}>
      {children}
    </OfficeShell>
  );
}
