import { may } from "@/app/frame";
import { LinkTabs } from "@/components/layout/link-tabs";
import { PageHeader } from "@/components/layout/page-header";
import { EditSystem } from "@/components/systems/system-forms";
import { paths } from "@/lib/domain/shared/paths";
import { getSystem } from "@/lib/services/systems/get-system";
import { read } from "@/lib/web/page";
import { changeSystemAction } from "../actions";

export default async function SystemLayout({ params, children }: LayoutProps<"/systems/[systemId]">) {
  const { systemId } = await params;
  const system = await read(getSystem, { systemId });
  const facts = [
    [system.maker, system.model].filter(Boolean).join(" "),
    system.location,
    `${system.devices} devices`,
    system.matrixVersion === null ? "no matrix" : `matrix version ${system.matrixVersion}`,
  ];
  return (
    <>
      <PageHeader
        trail={[
          { label: "Sites", href: paths.sites },
          { label: system.site.name, href: paths.site(system.site.id) },
        ]}
        title={system.name}
        note={facts.filter(Boolean).join(" · ")}
        actions={(await may("system:write")) && <EditSystem action={changeSystemAction} system={system} />}
      />
      <LinkTabs
        label="Parts of the system"
        items={[
          { href: paths.system(systemId), label: "Devices" },
          { href: paths.systemOutputs(systemId), label: "Outputs and equipment" },
          { href: paths.systemMatrix(systemId), label: "Matrix" },
          { href: paths.systemVersions(systemId), label: "Versions" },
          { href: paths.systemScript(systemId), label: "Script" },
        ]}
      />
      {children}
    </>
  );
}
