import type { Metadata } from "next";
import { CompanyForm } from "@/components/account/company-form";
import { PageHeader } from "@/components/layout/page-header";
import { zoneDataVersion, zonesOfCountry } from "@/lib/domain/shared/zone";
import { getCompany } from "@/lib/services/company/get-company";
import { read } from "@/lib/web/page";
import { updateCompanyAction } from "./actions";

export const metadata: Metadata = { title: "Settings" };

export default async function SettingsPage() {
  const company = await read(getCompany);
  return (
    <>
      <PageHeader title="Settings" note={`Time zone data ${zoneDataVersion}`} />
      <CompanyForm action={updateCompanyAction} company={company} zones={zonesOfCountry("US")} />
    </>
  );
}
