import { ShowCode } from "@/components/form/show-code";
import { Card } from "@/components/ui/card";
import { FIELD_WORDS_EN as WORDS } from "@/lib/domain/field/words";
import type { FieldVisit } from "@/lib/queries/field";

type Props = { visit: FieldVisit; heading: "h2" | "h3"; showDay: boolean };

export function FieldVisitCard({ visit, heading: Heading, showDay }: Props) {
  const { site, job, crew, accessNote, secrets, contacts } = visit;
  return (
    <Card className="grid gap-2 p-4">
      <p className="figures text-lg font-bold">
        {showDay && <span className="block font-sans">{dayOf(visit.startsLocal)}</span>}
        {visit.startsLocal.slice(11)}–{visit.endsLocal.slice(11)}
      </p>
      <Heading className="text-lg font-bold">{site.name}</Heading>
      <p>
        {site.street}, {site.city}
      </p>
      <p>
        {WORDS.jobKinds[job.kind]} <span className="figures">{job.number}</span>: {job.title}
      </p>
      {crew.length > 1 && (
        <p>
          {WORDS.with} {crew.map((person) => person.name).join(", ")}
        </p>
      )}
      {accessNote && (
        <p className="border-l-4 border-soon pl-3">
          <span className="font-semibold">{WORDS.access}: </span>
          {accessNote}
        </p>
      )}
      {secrets.map(({ id, label }) => (
        <div key={id} className="flex flex-wrap items-center justify-between gap-2 border-l-4 border-line pl-3">
          <span>{label}</span>
          <ShowCode secretId={id} label={label} size="thumb" />
        </div>
      ))}
      {secrets.length > 0 && <p className="text-sm text-muted">{WORDS.looksAreLogged}</p>}
      {contacts
        .filter((contact) => contact.phone)
        .map((contact) => (
          <a
            key={contact.name}
            href={`tel:${contact.phone}`}
            className="flex min-h-12 items-center justify-between rounded-md border border-field-line px-3"
          >
            <span>
              {WORDS.call} {contact.name}
            </span>
            <span className="figures">{contact.phone}</span>
          </a>
        ))}
    </Card>
  );
}

/** The local date has no zone of its own any more; UTC on both sides keeps it. */
const dayOf = (local: string): string =>
  new Intl.DateTimeFormat(WORDS.language, { weekday: "long", month: "long", day: "numeric", timeZone: "UTC" }).format(
    new Date(`${local.slice(0, 10)}T00:00Z`),
  );
