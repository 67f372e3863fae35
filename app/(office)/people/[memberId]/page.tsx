import type { Metadata } from "next";
import { cache } from "react";
import { may } from "@/app/frame";
import { RowAction } from "@/components/form/row-action";
import { Facts, PageHeader, Section } from "@/components/layout/page-header";
import { LicenseBadge } from "@/components/people/license-badge";
import { LicenseForm, RoleForm } from "@/components/people/people-forms";
import { Card, EmptyState } from "@/components/ui/card";
import { licenseState } from "@/lib/domain/people/license-state";
import { paths } from "@/lib/domain/shared/paths";
import { ROLE_WORDS } from "@/lib/domain/shared/roles";
import { getPerson } from "@/lib/services/people/get-person";
import { read } from "@/lib/web/page";
import {
  changeRoleAction,
  endMembershipAction,
  recordLicenseAction,
  resendInvitationAction,
  restoreMembershipAction,
} from "../actions";

/** Asked once for the title and the page. */
const personOf = cache((memberId: string) => read(getPerson, { memberId }));

type Props = PageProps<"/people/[memberId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await personOf((await params).memberId)).name };
}

export default async function PersonPage({ params }: Props) {
  const person = await personOf((await params).memberId);
  const { details } = person;
  const mayWrite = await may("person:write");
  const own = { name: "memberId", value: person.id };
  return (
    <>
      <PageHeader
        trail={[{ href: paths.people, label: "People" }]}
        title={person.name}
        note={ROLE_WORDS[person.role]}
      />
      <Card>
        <Facts
          rows={[
            ["E-mail", details.email],
            ["Telephone", details.phone],
            ["Home", [details.homeStreet, details.homeCity].filter(Boolean).join(", ") || null],
          ]}
        />
      </Card>
      <Section title="Licenses">
        {person.licenses.length === 0 && <EmptyState title="None recorded" />}
        {person.licenses.map((license) => (
          <Card key={license.id} className="flex flex-wrap items-center justify-between gap-2 p-3 sm:p-3">
            <span>
              {license.kind}, {license.jurisdiction} <span className="figures">{license.number}</span>
            </span>
            <span className="figures">{license.expiresOn}</span>
            <LicenseBadge state={licenseState(license.expiresOn, person.today)} />
          </Card>
        ))}
        {mayWrite && <LicenseForm action={recordLicenseAction} memberId={person.id} />}
      </Section>
      {mayWrite && (
        <Section title="Access">
          {person.endedAt ? (
            <RowAction action={restoreMembershipAction} {...own} button="Give access again" />
          ) : (
            <>
              {person.role !== "customer" && (
                <RoleForm action={changeRoleAction} memberId={person.id} role={person.role} />
              )}
              <div className="flex flex-wrap gap-2">
                <RowAction action={resendInvitationAction} {...own} button="Send the invitation again" />
                <RowAction action={endMembershipAction} {...own} button="End access now" danger />
              </div>
            </>
          )}
        </Section>
      )}
    </>
  );
}
