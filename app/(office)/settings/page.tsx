import type { Metadata } from "next";
import Link from "next/link";
import { CompanyForm } from "@/components/account/company-form";
import { PageHeader } from "@/components/layout/page-header";
import { paths } from "@/lib/domain/shared/paths";
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
      <p>
        <Link href={paths.deliveries} className="underline">
          Failed deliveries
        </Link>
      </p>
    </>
  );
}
