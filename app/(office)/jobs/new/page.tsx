import type { Metadata } from "next";
import { CallForm } from "@/components/jobs/call-form";
import { PageHeader } from "@/components/layout/page-header";
import { paths } from "@/lib/domain/shared/paths";
import { getSiteBrief } from "@/lib/services/find/get-site-brief";
import { read } from "@/lib/web/page";
import { createJobAction } from "../actions";

export const metadata: Metadata = { title: "New call" };

export default async function NewJobPage({ searchParams }: PageProps<"/jobs/new">) {
  const { site } = await searchParams;
  return (
    <>
      <PageHeader title="New call" trail={[{ href: paths.jobs, label: "Jobs" }]} />
      <CallForm
        key={String(site)}
        action={createJobAction}
        site={typeof site === "string" ? await read(getSiteBrief, { siteId: site }) : null}
      />
    </>
  );
}
