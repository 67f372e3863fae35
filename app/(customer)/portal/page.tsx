import type { Metadata } from "next";
import { Shell } from "@/components/layout/shell";
import { PortalHome } from "@/components/visits/portal-home";
import { paths } from "@/lib/domain/shared/paths";
import { getFrame } from "@/lib/services/company/get-frame";
import { getPortal } from "@/lib/services/visits/get-portal";
import { read } from "@/lib/web/page";
import { leaveAction } from "../../(public)/actions";
import { answerAction } from "./actions";

export const metadata: Metadata = { title: "Your buildings" };

export default async function PortalPage() {
  const { company, personName } = await read(getFrame);
  const portal = await read(getPortal);
  return (
    <Shell
      companyName={company.name}
      personName={personName}
      items={[{ href: paths.portal, label: "Your buildings" }]}
      leave={leaveAction}
    >
      <PortalHome {...portal} now={new Date()} answer={answerAction} />
    </Shell>
  );
}
