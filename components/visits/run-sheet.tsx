import Link from "next/link";
import { EmptyState } from "@/components/ui/card";
import { JOB_KIND_WORDS, type JobKind } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";

type Visit = {
  id: string;
  startsLocal: string;
  endsLocal: string;
  canceledAt: Date | null;
  site: { id: string; name: string; city: string };
  job: { number: number; kind: JobKind; title: string };
  crew: { memberId: string; name: string; lead: boolean }[];
};

type Props = { technicians: { id: string; name: string }[]; visits: Visit[] };

/** One column per person, time running down. */
export function RunSheet({ technicians, visits }: Props) {
  const standing = visits.filter((visit) => !visit.canceledAt);
  if (technicians.length === 0) {
    return <EmptyState title="No technicians yet">Invite them under People.</EmptyState>;
  }
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard (WCAG 2.1.1)
    <section className="overflow-x-auto pb-2" tabIndex={0} aria-label="Visits by technician">
      <ol className="grid auto-cols-[minmax(12rem,1fr)] grid-flow-col gap-2">
        {technicians.map((technician) => (
          <li key={technician.id} className="grid content-start gap-2 border-l border-line pl-2">
            <h2 className="sticky top-0 font-bold">{technician.name}</h2>
            <DayOf visits={standing.filter((visit) => visit.crew.some((one) => one.memberId === technician.id))} />
          </li>
        ))}
      </ol>
    </section>
  );
}

function DayOf({ visits }: { visits: Visit[] }) {
  if (visits.length === 0) return <p className="text-sm text-muted">No visits</p>;
  return (
    <ol className="grid gap-2">
      {visits.map((visit) => (
        <li key={visit.id} className="rounded-md border border-line border-l-4 border-l-settled bg-surface p-2">
          <p className="figures text-sm">
            {visit.startsLocal.slice(11)}–{visit.endsLocal.slice(11)}
          </p>
          <Link href={paths.site(visit.site.id)} className="font-semibold hover:underline">
            {visit.site.name}
          </Link>
          <p className="text-sm">
            {JOB_KIND_WORDS[visit.job.kind]} <span className="figures">{visit.job.number}</span>
          </p>
          <p className="text-sm text-muted">{visit.job.title}</p>
          {visit.crew.length > 1 && (
            <p className="text-sm">with {visit.crew.map((one) => one.name.split(" ")[0]).join(", ")}</p>
          )}
        </li>
      ))}
    </ol>
  );
}
