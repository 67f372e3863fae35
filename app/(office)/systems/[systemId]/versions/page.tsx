import type { Metadata } from "next";
import { VersionsList } from "@/components/matrix/versions-list";
import { listVersions } from "@/lib/services/sequences/list-versions";
import { getSystem } from "@/lib/services/systems/get-system";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Versions of the matrix" };

export default async function VersionsPage({ params }: PageProps<"/systems/[systemId]/versions">) {
  const { systemId } = await params;
  const { site } = await read(getSystem, { systemId });
  return <VersionsList systemId={systemId} zone={site.zone} versions={await read(listVersions, { systemId })} />;
}
