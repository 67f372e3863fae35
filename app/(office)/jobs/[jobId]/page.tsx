import type { Metadata } from "next";
import { may } from "@/app/frame";
import { CloseJob } from "@/components/jobs/close-job";
import { JobHistory } from "@/components/jobs/history";
import { JobFacts } from "@/components/jobs/job-facts";
import { JobForm } from "@/components/jobs/job-form";
import { JobStateBadge } from "@/components/jobs/job-state-badge";
import { JobTerms } from "@/components/jobs/terms";
import { JobWaits } from "@/components/jobs/waits";
import { PageHeader, Section } from "@/components/layout/page-header";
import { Badge } from "@/components/ui/badge";
import { EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { BookVisit } from "@/components/visits/book-visit";
import { paths } from "@/lib/domain/shared/paths";
import { addDays } from "@/lib/domain/shared/zone";
import { getJob } from "@/lib/services/jobs/get-job";
import { read } from "@/lib/web/page";
import {
  cancelJobAction,
  endWaitAction,
  recordDoneAction,
  setTermsAction,
  updateJobAction,
  waitForAction,
} from "../actions";

export const metadata: Metadata = { title: "Job" };

export default async function JobPage({ params }: PageProps<"/jobs/[jobId]">) {
  const job = await read(getJob, await params);
  const open = job.canceledAt === null && job.doneOn === null;
  const mayWrite = (await may("job:write")) && job.canceledAt === null;
  return (
    <>
      <PageHeader
        title={job.title}
        trail={[{ href: paths.jobs, label: "Jobs" }]}
        note={`Job ${job.number} · ${job.site.name}, ${job.site.city}`}
        status={
          <>
            <JobStateBadge state={job.state} />
            {job.urgent && open && <Badge tone="alert">Urgent</Badge>}
          </>
        }
      />
      <JobFacts job={job} />
      <section id="visits" aria-label="Visits" className="scroll-mt-20">
        <Section title="Visits">
          {job.visits.length === 0 && <EmptyState title="Nothing booked yet" />}
          <ol className="grid gap-1">
            {job.visits.map((visit) => (
              <li key={visit.id} className={visit.canceledAt ? "text-muted line-through" : undefined}>
                <span className="figures">
                  {visit.startsLocal.replace("T", " ")} to {visit.endsLocal.slice(11)}
                </span>{" "}
                {visit.crew.join(", ")}{" "}
                <TextLink href={paths.runSheet(visit.startsLocal.slice(0, 10))}>on the run sheet</TextLink>
              </li>
            ))}
          </ol>
          {open && (await may("visit:write")) && (
            <BookVisit jobId={job.id} date={firstDay(job.today, job.window?.earliest)} />
          )}
        </Section>
      </section>
      <div className="grid gap-5 lg:grid-cols-2">
        <section id="terms" aria-label="Purchase order and limit" className="scroll-mt-20">
          <Section title="Purchase order and limit">
            <JobTerms
              jobId={job.id}
              terms={job.terms}
              demanded={job.agreement?.purchaseOrderNeeded ?? false}
              action={mayWrite ? setTermsAction : undefined}
            />
          </Section>
        </section>
        <Section title="Waits">
          <JobWaits
            jobId={job.id}
            waits={job.waits}
            zone={job.site.zone}
            today={job.today}
            actions={mayWrite && open ? { wait: waitForAction, endWait: endWaitAction } : undefined}
          />
        </Section>
      </div>
      {mayWrite && open && (
        <Section title="Done, or not needed">
          <CloseJob
            jobId={job.id}
            state={job.state}
            today={job.today}
            isOccurrence={job.agreementItemId !== null}
            done={recordDoneAction}
            cancel={cancelJobAction}
          />
        </Section>
      )}
      {mayWrite && open && (
        <Section title="Change">
          <JobForm action={updateJobAction} job={job} />
        </Section>
      )}
      <Section title="History" note={`Times at the site, ${job.site.zone}`}>
        <JobHistory history={job.history} zone={job.site.zone} />
      </Section>
    </>
  );
}

/** Tomorrow, unless the due window opens later. */
const firstDay = (today: string, earliest: string | undefined): string => {
  const tomorrow = addDays(today, 1);
  return earliest && earliest > tomorrow ? earliest : tomorrow;
};
