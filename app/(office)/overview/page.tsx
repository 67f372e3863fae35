import type { Metadata } from "next";
import { PageHeader } from "@/components/layout/page-header";
import { Attention } from "@/components/people/attention";
import { getOverview } from "@/lib/services/visits/get-overview";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Overview" };

export default async function OverviewPage() {
  const overview = await read(getOverview);
  return (
    <>
      <PageHeader title="Overview" note="What needs an owner's eye" />
      <Attention {...overview} />
    </>
  );
}
