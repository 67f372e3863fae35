import type { Metadata } from "next";
import { cache } from "react";
import { may } from "@/app/frame";
import { PageHeader, Section } from "@/components/layout/page-header";
import { SiteForm } from "@/components/sites/site-form";
import { SiteSummary } from "@/components/sites/site-summary";
import { paths } from "@/lib/domain/shared/paths";
import { zonesOfCountry } from "@/lib/domain/shared/zone";
import { getSite } from "@/lib/services/sites/get-site";
import { read } from "@/lib/web/page";
import { updateSiteAction } from "../actions";

/** Asked once for the title and the page. */
const siteOf = cache((siteId: string) => read(getSite, { siteId }));

type Props = PageProps<"/sites/[siteId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await siteOf((await params).siteId)).name };
}

export default async function SitePage({ params }: Props) {
  const site = await siteOf((await params).siteId);
  return (
    <>
      <PageHeader
        trail={[{ href: paths.sites, label: "Sites" }]}
        title={site.name}
        note={`${site.street}, ${site.city}, ${site.state} ${site.postalCode}`}
      />
      <SiteSummary site={site} />
      {(await may("site:write")) && (
        <Section title="Change">
          <SiteForm action={updateSiteAction} zones={zonesOfCountry("US")} zone={site.zone} site={site} />
        </Section>
      )}
    </>
  );
}
