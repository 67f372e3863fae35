import type { FormAction } from "@/components/form/form";
import { PageHeader, Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { toLocalTime } from "@/lib/domain/shared/zone";
import { AnswerForm } from "./answer-form";
import { AnswerGiven, type AskedVisit, AskedVisitFacts, type GivenAnswer, VisitCaution } from "./asked-visit";

type Visit = AskedVisit & {
  id: string;
  zone: string;
  canceledAt: Date | null;
  ask: (GivenAnswer & { id: string }) | null;
};

type Props = {
  company: { name: string; phone: string };
  sites: { id: string; name: string; street: string; city: string }[];
  visits: Visit[];
  now: Date;
  answer: FormAction;
};

export function PortalHome({ company, sites, visits, now, answer }: Props) {
  const standing = visits.filter((visit) => !visit.canceledAt);
  const coming = standing.filter((visit) => visit.endsAt > now);
  const waiting = coming.filter((visit) => visit.ask && !visit.ask.answer);
  const settled = coming.filter((visit) => !waiting.includes(visit));
  return (
    <>
      <PageHeader title="Your buildings" note={company.name} />
      {waiting.length > 0 && (
        <Section title="Waiting for your answer" note="We come once you have said that it can take place.">
          <VisitCaution />
          {waiting.map((visit) => (
            <Card key={visit.id} className="grid gap-4" aria-label={`${visit.job.title}, ${visit.site.name}`}>
              <AskedVisitFacts visit={visit} />
              <AnswerForm action={answer} name="askId" value={visit.ask?.id ?? ""} />
            </Card>
          ))}
        </Section>
      )}
      <Section title="Coming visits">
        <Visits visits={settled} none={waiting.length > 0 ? "No other visit is planned" : "No visit is planned"} />
      </Section>
      <Section title="Past visits">
        <Visits visits={standing.filter((visit) => visit.endsAt <= now).reverse()} none="No visit yet" />
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
          <Card className="grid gap-3 p-3 sm:p-3">
            <AskedVisitFacts visit={visit} />
            {visit.ask && (
              <AnswerGiven ask={visit.ask} on={visit.ask.answeredAt && toLocalTime(visit.ask.answeredAt, visit.zone)} />
            )}
          </Card>
        </li>
      ))}
    </ol>
  );
}
