import Link from "next/link";
import { Facts, Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import { JOB_KIND_WORDS, type JobKind } from "@/lib/domain/jobs/words";
import { paths } from "@/lib/domain/shared/paths";
import { HOLDER_CAPACITY_WORDS, type HolderCapacity, SITE_KIND_WORDS, type SiteKind } from "@/lib/domain/sites/words";

type Site = {
  kind: SiteKind;
  zone: string;
  accessNote: string | null;
  holders: {
    holder: { id: string; capacity: HolderCapacity; fromDate: string; toDate: string | null };
    customer: { id: string; name: string; phone: string | null };
  }[];
  contacts: { id: string; name: string; title: string | null; phone: string | null; email: string | null }[];
  visits: {
    visit: { id: string; startsLocal: string; canceledAt: Date | null };
    job: { number: number; title: string; kind: JobKind };
  }[];
};

export function SiteSummary({ site }: { site: Site }) {
  return (
    <div className="grid gap-5 lg:grid-cols-2">
      <Section title="The place">
        <Card>
          <Facts
            rows={[
              ["Kind", SITE_KIND_WORDS[site.kind]],
              ["Time zone", site.zone],
              ["Access", site.accessNote],
            ]}
          />
        </Card>
      </Section>
      <Section title="Held by">
        {site.holders.length === 0 && <EmptyState title="Nobody yet">Nobody can be billed for this site.</EmptyState>}
        {site.holders.map(({ holder, customer }) => (
          <Card key={holder.id} className="p-3 sm:p-3">
            <Link href={paths.customer(customer.id)} className="font-semibold hover:underline">
              {customer.name}
            </Link>
            <p className="text-sm">
              {HOLDER_CAPACITY_WORDS[holder.capacity]}, from <span className="figures">{holder.fromDate}</span>
              {holder.toDate && (
                <>
                  {" "}
                  to <span className="figures">{holder.toDate}</span>
                </>
              )}
            </p>
          </Card>
        ))}
      </Section>
      <Section title="Contacts">
        {site.contacts.length === 0 && <EmptyState title="No contact" />}
        {site.contacts.map((contact) => (
          <Card key={contact.id} className="p-3 sm:p-3">
            <p className="font-semibold">{contact.name}</p>
            <p className="text-sm text-muted">{contact.title}</p>
            {contact.phone && (
              <a href={`tel:${contact.phone}`} className="figures underline">
                {contact.phone}
              </a>
            )}
          </Card>
        ))}
      </Section>
      <Section title="Visits">
        {site.visits.length === 0 && <EmptyState title="No visit yet" />}
        <ol className="grid gap-1">
          {site.visits.map(({ visit, job }) => (
            <li key={visit.id} className={visit.canceledAt ? "text-muted line-through" : undefined}>
              <span className="figures">{visit.startsLocal.replace("T", " ")}</span> {JOB_KIND_WORDS[job.kind]}{" "}
              <span className="figures">{job.number}</span> {job.title}
            </li>
          ))}
        </ol>
      </Section>
    </div>
  );
}
