import type { Metadata } from "next";
import { may } from "@/app/frame";
import { PointsTable } from "@/components/systems/points-table";
import { paths } from "@/lib/domain/shared/paths";
import { getSystem } from "@/lib/services/systems/get-system";
import { listPoints } from "@/lib/services/systems/list-points";
import { read } from "@/lib/web/page";
import { putBackEntryAction, removeEntryAction, savePointAction, saveZoneAction } from "../actions";

export const metadata: Metadata = { title: "Devices" };

export default async function PointsPage({ params, searchParams }: PageProps<"/systems/[systemId]">) {
  const { systemId } = await params;
  const search = await searchParams;
  const { today } = await read(getSystem, { systemId });
  const list = await read(listPoints, { ...search, systemId });
  return (
    <PointsTable
      {...list}
      systemId={systemId}
      today={today}
      path={paths.system(systemId)}
      search={search}
      mayChange={await may("system:write")}
      actions={{
        savePoint: savePointAction,
        saveZone: saveZoneAction,
        remove: removeEntryAction,
        putBack: putBackEntryAction,
      }}
    />
  );
}
