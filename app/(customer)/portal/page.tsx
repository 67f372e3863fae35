import type { Metadata } from "next";
import { PortalShell } from "@/components/layout/portal-shell";
import { PortalHome } from "@/components/visits/portal-home";
import { paths } from "@/lib/domain/shared/paths";
import { getPortal } from "@/lib/services/visits/get-portal";
import { read } from "@/lib/web/page";
import { leaveAction } from "../../(public)/actions";
import { frame } from "../../frame";
import { answerAction } from "./actions";

export const metadata: Metadata = { title: "Your buildings" };

export default async function PortalPage() {
  const { company, personName } = await frame();
  const portal = await read(getPortal);
  return (
    <PortalShell
      companyName={company.name}
      personName={personName}
      items={[{ href: paths.portal, label: "Your buildings" }]}
      leave={leaveAction}
      footer={
        <p>
          Questions? {company.name},{" "}
          <a href={`tel:${company.phone}`} className="figures underline">
            {company.phone}
          </a>
        </p>
      }
    >
      <PortalHome {...portal} now={new Date()} answer={answerAction} />
    </PortalShell>
  );
}
