import type { Metadata } from "next";
import { only } from "@/app/frame";
import { PageHeader } from "@/components/layout/page-header";
import { SiteForm } from "@/components/sites/site-form";
import { zonesOfCountry } from "@/lib/domain/shared/zone";
import { getCompany } from "@/lib/services/company/get-company";
import { read } from "@/lib/web/page";
import { createSiteAction } from "../actions";

export const metadata: Metadata = { title: "New site" };

export default async function NewSitePage() {
  await only("site:write");
  const { zone } = await read(getCompany);
  return (
    <>
      <PageHeader title="New site" />
      <SiteForm action={createSiteAction} zones={zonesOfCountry("US")} zone={zone} />
    </>
  );
}
