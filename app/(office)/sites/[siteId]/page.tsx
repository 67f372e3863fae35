import type { Metadata } from "next";
import Link from "next/link";
import { cache } from "react";
import { frame } from "@/app/frame";
import { PageHeader } from "@/components/layout/page-header";
import { AccessSection } from "@/components/sites/access-section";
import { PapersSection } from "@/components/sites/papers-section";
import { PeopleSection } from "@/components/sites/people-section";
import { PlaceSection } from "@/components/sites/place-section";
import { SiteNav, SitePart } from "@/components/sites/site-nav";
import { WindowsSection } from "@/components/sites/windows-section";
import { SystemsSection, WorkSection } from "@/components/sites/work-section";
import { Button } from "@/components/ui/button";
import { paths } from "@/lib/domain/shared/paths";
import { mayDo } from "@/lib/domain/shared/permissions";
import { listCustomerChoices } from "@/lib/services/customers/list-customer-choices";
import { getSite } from "@/lib/services/sites/get-site";
import { getSiteFacts } from "@/lib/services/sites/get-site-facts";
import { read } from "@/lib/web/page";
import * as actions from "../actions";

/** Asked once for the title and the page. */
const siteOf = cache((siteId: string) => read(getSite, { siteId }));

export async function generateMetadata({ params }: PageProps<"/sites/[siteId]">): Promise<Metadata> {
  return { title: (await siteOf((await params).siteId)).name };
}

export default async function SitePage({ params }: PageProps<"/sites/[siteId]">) {
  const { siteId } = await params;
  const { role } = await frame();
  const [site, facts, customers] = [
    await siteOf(siteId),
    await read(getSiteFacts, { siteId }),
    await read(listCustomerChoices),
  ];
  const mayChange = mayDo(role, "site:write");
  const shared = { siteId, mayChange };
  return (
    <>
      <PageHeader
        trail={[{ label: "Sites", href: paths.sites }]}
        title={site.name}
        note={`${site.street}, ${site.city}, ${site.state} ${site.postalCode}`}
        actions={
          <>
            {mayDo(role, "job:write") && (
              <Button asChild>
                <Link href={paths.newJob(siteId)}>New job</Link>
              </Button>
            )}
            {mayChange && (
              <Button asChild>
                <Link href={paths.editSite(siteId)}>Edit</Link>
              </Button>
            )}
          </>
        }
      />
      <SiteNav />
      <div className="grid min-w-0 grid-cols-1 items-start gap-5 lg:grid-cols-2">
        <SitePart id="place">
          <PlaceSection site={site} />
        </SitePart>
        <SitePart id="people">
          <PeopleSection
            {...shared}
            today={facts.today}
            holders={site.holders}
            contacts={site.contacts}
            customers={customers}
            actions={{ add: actions.addHolderAction, end: actions.endHolderAction }}
          />
        </SitePart>
      </div>
      <SitePart id="windows">
        <WindowsSection
          {...shared}
          zone={site.zone}
          now={facts.now}
          windows={facts.windows}
          noTestDates={facts.noTestDates}
          attendances={facts.attendances}
          contacts={site.contacts}
          actions={{
            addWindow: actions.addWindowAction,
            endWindow: actions.endWindowAction,
            addNoTest: actions.addNoTestAction,
            endNoTest: actions.endNoTestAction,
            addAttendance: actions.addAttendanceAction,
            endAttendance: actions.endAttendanceAction,
          }}
        />
      </SitePart>
      <SitePart id="access">
        <AccessSection
          {...shared}
          mayLook={mayDo(role, "secret:look")}
          accessNote={site.accessNote}
          keys={facts.keys}
          secrets={facts.secrets}
          stationAccounts={facts.stationAccounts}
          actions={{
            addKey: actions.addKeyAction,
            handOverKey: actions.handOverKeyAction,
            endKey: actions.endKeyAction,
            addSecret: actions.addSecretAction,
            endSecret: actions.endSecretAction,
            addStationAccount: actions.addStationAccountAction,
            endStationAccount: actions.endStationAccountAction,
          }}
        />
      </SitePart>
      <div className="grid min-w-0 grid-cols-1 items-start gap-5 lg:grid-cols-2">
        <SitePart id="systems">
          <SystemsSection {...shared} systems={facts.systems} />
        </SitePart>
        <SitePart id="papers">
          <PapersSection
            {...shared}
            documents={facts.documents}
            actions={{ add: actions.addDocumentAction, end: actions.endDocumentAction }}
          />
        </SitePart>
      </div>
      <SitePart id="work">
        <WorkSection jobs={facts.jobs} visits={site.visits} />
      </SitePart>
    </>
  );
}
