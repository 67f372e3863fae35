import { PageHeader, Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { JOB_KIND_WORDS, type JobKind } from "@/lib/domain/jobs/words";

type Visit = {
  id: string;
  startsAt: Date;
  startsLocal: string;
  endsLocal: string;
  canceledAt: Date | null;
  site: { name: string };
  job: { kind: JobKind; title: string };
  crew: { memberId: string; name: string }[];
};

type Props = {
  company: { name: string; phone: string };
  sites: { id: string; name: string; street: string; city: string }[];
  visits: Visit[];
  now: Date;
};

export function PortalHome({ company, sites, visits, now }: Props) {
  const standing = visits.filter((visit) => !visit.canceledAt);
  return (
    <>
      <PageHeader title="Your buildings" note={company.name} />
      <Section title="Coming visits">
        <Visits visits={standing.filter((visit) => visit.startsAt >= now)} none="No visit is planned" />
      </Section>
      <Section title="Past visits">
        <Visits visits={standing.filter((visit) => visit.startsAt < now).reverse()} none="No visit yet" />
      </Section>
      <Section title="Sites">
        {sites.length === 0 && (
          <EmptyState title="No site is open to you">Ask the company that invited you.</EmptyState>
        )}
        <ul className="grid gap-2 sm:grid-cols-2">
          {sites.map((site) => (
            <li key={site.id}>
              <Card className="p-3 sm:p-3">
                <p className="font-semibold">{site.name}</p>
                <p className="text-muted">
                  {site.street}, {site.city}
                </p>
              </Card>
            </li>
          ))}
        </ul>
      </Section>
    </>
  );
}

function Visits({ visits, none }: { visits: Visit[]; none: string }) {
  if (visits.length === 0) return <EmptyState title={none} />;
  return (
    <ol className="grid gap-2">
      {visits.map((visit) => (
        <li key={visit.id}>
          <Card className="p-3 sm:p-3">
            <p className="figures">
              {visit.startsLocal.replace("T", " ")}–{visit.endsLocal.slice(11)}
            </p>
            <p className="font-semibold">{visit.site.name}</p>
            <p>
              {JOB_KIND_WORDS[visit.job.kind]}: {visit.job.title}
            </p>
            <p className="text-sm text-muted">{visit.crew.map((person) => person.name).join(", ")}</p>
          </Card>
        </li>
      ))}
    </ol>
  );
}
