import Link from "next/link";
import { Section } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { TextLink } from "@/components/ui/text-link";
import { JOB_KIND_WORDS, type JobKind } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { Entries, Entry, Nothing } from "./entries";

type System = {
  id: string;
  name: string;
  maker: string | null;
  model: string | null;
  location: string | null;
  devices: number | null;
};

export const SystemsSection = ({
  siteId,
  systems,
  mayChange,
}: {
  siteId: string;
  systems: readonly System[];
  mayChange: boolean;
}) => (
  <Section
    title="Systems"
    actions={
      mayChange && (
        <Button asChild size="small">
          <Link href={paths.newSystem(siteId)}>Add system</Link>
        </Button>
      )
    }
  >
    {systems.length === 0 && (
      <Nothing>No system yet. Add one with nothing on it, or import its device list; it grows while you walk.</Nothing>
    )}
    {systems.length > 0 && (
      <Entries>
        {systems.map(({ id, name, maker, model, location, devices }) => (
          <Entry key={id} title={<TextLink href={paths.system(id)}>{name}</TextLink>}>
            <p>{[maker, model, location].filter(Boolean).join(", ")}</p>
            <p>
              <span className="figures">{devices ?? 0}</span> devices
            </p>
          </Entry>
        ))}
      </Entries>
    )}
  </Section>
);

type Job = {
  id: string;
  number: number;
  kind: JobKind;
  title: string;
  canceledAt: Date | null;
  doneOn: string | null;
  targetOn: string | null;
};
type Visit = {
  visit: { id: string; startsLocal: string; canceledAt: Date | null };
  job: { id: string; number: number; title: string; kind: JobKind };
};

const stateOf = ({ canceledAt, doneOn, targetOn }: Job): string => {
  if (canceledAt) return "canceled";
  if (doneOn) return `done ${doneOn}`;
  return targetOn ? `open, target ${targetOn}` : "open";
};

export function WorkSection({ jobs, visits }: { jobs: readonly Job[]; visits: readonly Visit[] }) {
  return (
    <div className="grid min-w-0 grid-cols-1 items-start gap-5 lg:grid-cols-2">
      <Section title="Jobs">
        {jobs.length === 0 && <Nothing>No job yet.</Nothing>}
        {jobs.length > 0 && (
          <Entries>
            {jobs.map((job) => (
              <Entry
                key={job.id}
                title={
                  <TextLink href={paths.job(job.id)}>
                    <span className="figures">{job.number}</span> {job.title}
                  </TextLink>
                }
              >
                <p>
                  {JOB_KIND_WORDS[job.kind]}, {stateOf(job)}
                </p>
              </Entry>
            ))}
          </Entries>
        )}
      </Section>
      <Section title="Visits">
        {visits.length === 0 && <Nothing>No visit yet.</Nothing>}
        {visits.length > 0 && (
          <Entries>
            {visits.map(({ visit, job }) => (
              <Entry key={visit.id} title={<span className="figures">{visit.startsLocal.replace("T", " ")}</span>}>
                <p>
                  <TextLink href={paths.job(job.id)}>
                    <span className="figures">{job.number}</span> {job.title}
                  </TextLink>
                  {visit.canceledAt && ", canceled"}
                </p>
              </Entry>
            ))}
          </Entries>
        )}
      </Section>
    </div>
  );
}
