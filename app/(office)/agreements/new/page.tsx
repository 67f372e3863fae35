import type { Metadata } from "next";
import { AgreementForm } from "@/components/agreements/agreement-form";
import { PageHeader } from "@/components/layout/page-header";
import { paths } from "@/lib/domain/shared/paths";
import { calendarDate } from "@/lib/domain/shared/zone";

import { getCompany } from "@/lib/services/company/get-company";
import { listCustomerChoices } from "@/lib/services/customers/list-customer-choices";
import { read } from "@/lib/web/page";
import { createAgreementAction } from "../actions";

export const metadata: Metadata = { title: "New agreement" };

export default async function NewAgreementPage({ searchParams }: PageProps<"/agreements/new">) {
  const { customer } = await searchParams;
  const { zone } = await read(getCompany);
  return (
    <>
      <PageHeader
        title="New agreement"
        trail={[{ href: paths.agreements, label: "Agreements" }]}
        note="First with whom and from when; the tests, sites and prices come on the next page."
      />
      <AgreementForm
        action={createAgreementAction}
        today={calendarDate(new Date(), zone)}
        customers={await read(listCustomerChoices)}
        customerId={typeof customer === "string" ? customer : undefined}
      />
    </>
  );
}
