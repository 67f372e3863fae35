import type { Metadata } from "next";
import { PageHeader } from "@/components/layout/page-header";
import { SiteForm } from "@/components/sites/site-form";
import { paths } from "@/lib/domain/shared/paths";
import { zonesOfCountry } from "@/lib/domain/shared/zone";
import { getSite } from "@/lib/services/sites/get-site";
import { read } from "@/lib/web/page";
import { updateSiteAction } from "../../actions";

export const metadata: Metadata = { title: "Edit site" };

export default async function EditSitePage({ params }: PageProps<"/sites/[siteId]/edit">) {
  const site = await read(getSite, await params);
  return (
    <>
      <PageHeader
        trail={[
          { label: "Sites", href: paths.sites },
          { label: site.name, href: paths.site(site.id) },
        ]}
        title="Edit site"
      />
      <SiteForm action={updateSiteAction} zones={zonesOfCountry("US")} zone={site.zone} site={site} />
    </>
  );
}
