import { Facts } from "@/components/layout/page-header";
import { Card } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import type { DueState, DueWindow } from "@/lib/domain/agreements/due-window";
import { DUE_STATE_WORDS, shortDate } from "@/lib/domain/agreements/due-words";
import { JOB_KIND_WORDS, type JobKind } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { FUNCTION_WORDS, type SystemFunction } from "@/lib/domain/systems/words";

type Job = {
  kind: JobKind;
  details: string | null;
  functions: SystemFunction[];
  visitMinutes: number;
  crewSize: number;
  callerName: string | null;
  callerPhone: string | null;
  systemId: string | null;
  madeBy: string | null;
  doneOn: string | null;
  cancelReason: string | null;
  site: { id: string; name: string; street: string; city: string; state: string };
  systems: readonly { id: string; name: string }[];
  agreement: { id: string; number: number; name: string } | null;
  window: DueWindow | null;
  due: { state: DueState; daysLeft: number } | null;
  contacts: readonly { id: string; name: string; title: string | null; phone: string | null }[];
};

/** What is to be done, where, when at the latest, and whom to call about it. */
export function JobFacts({ job }: { job: Job }) {
  const system = job.systems.find((one) => one.id === job.systemId);
  const rows: [string, React.ReactNode][] = [
    [
      "Site",
      <span key="site">
        <TextLink href={paths.site(job.site.id)}>{job.site.name}</TextLink>, {job.site.street}, {job.site.city}
      </span>,
    ],
    ["Kind", JOB_KIND_WORDS[job.kind]],
  ];
  if (system) rows.push(["System", system.name]);
  if (job.details) rows.push(["In more words", job.details]);
  if (job.callerName || job.callerPhone) {
    rows.push([
      "Caller",
      <span key="caller">
        {job.callerName} {job.callerPhone && <Phone number={job.callerPhone} />}
      </span>,
    ]);
  }
  if (job.agreement) {
    rows.push([
      "Agreement",
      <TextLink key="agreement" href={paths.agreement(job.agreement.id)}>
        {job.agreement.number} {job.agreement.name}
      </TextLink>,
    ]);
  }
  if (job.window && job.due) {
    rows.push([
      "Due",
      <span key="due" className="figures">
        {shortDate(job.window.earliest)} to {shortDate(job.window.latest)}, target {shortDate(job.window.target)}
        {!job.doneOn && !job.cancelReason && ` · ${DUE_STATE_WORDS[job.due.state].toLowerCase()}`}
      </span>,
    ]);
  }
  rows.push(
    ["Operates", job.functions.map((one) => FUNCTION_WORDS[one]).join(", ") || "Nothing: any hour will do"],
    [
      "Takes",
      <span key="takes" className="figures">
        {job.visitMinutes} min, crew of {job.crewSize}
      </span>,
    ],
    ["Made by", job.madeBy ?? "The due list, by itself"],
  );
  if (job.doneOn) rows.push(["Done", <span key="done" className="figures">{`${job.doneOn}`}</span>]);
  if (job.cancelReason) rows.push(["Canceled", job.cancelReason]);
  rows.push([
    "Contacts",
    job.contacts.length > 0 ? (
      <ul key="contacts">
        {job.contacts.map((contact) => (
          <li key={contact.id}>
            {contact.name}
            {contact.title && <span className="text-muted">, {contact.title}</span>}{" "}
            {contact.phone && <Phone number={contact.phone} />}
          </li>
        ))}
      </ul>
    ) : (
      "None yet"
    ),
  ]);
  return (
    <Card>
      <Facts rows={rows} />
    </Card>
  );
}

const Phone = ({ number }: { number: string }) => (
  <a href={`tel:${number}`} className="figures underline">
    {number}
  </a>
);
