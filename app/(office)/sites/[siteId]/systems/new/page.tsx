import type { Metadata } from "next";
import { PageHeader } from "@/components/layout/page-header";
import { NewSystemForm } from "@/components/systems/system-forms";
import { paths } from "@/lib/domain/shared/paths";
import { getSite } from "@/lib/services/sites/get-site";
import { read } from "@/lib/web/page";
import { addSystemAction } from "../../../actions";

export const metadata: Metadata = { title: "New system" };

export default async function NewSystemPage({ params }: PageProps<"/sites/[siteId]/systems/new">) {
  const site = await read(getSite, await params);
  return (
    <>
      <PageHeader
        trail={[
          { label: "Sites", href: paths.sites },
          { label: site.name, href: paths.site(site.id) },
        ]}
        title="New system"
        note="A control unit and what hangs on it. Its name is enough to begin with; the rest grows while you walk."
      />
      <NewSystemForm action={addSystemAction} siteId={site.id} />
    </>
  );
}
