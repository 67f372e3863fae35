import type { SiteChoice } from "@/components/form/site-field";
import { Card } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import type { SiteBrief } from "@/lib/domain/shared/found";
import { paths } from "@/lib/domain/shared/paths";

type Contact = SiteBrief["contacts"][number];
type Props = { site: SiteChoice | null; children: (contact: Contact) => React.ReactNode };

/** What is known of the site while the caller is on the line. */
export function SiteAtHand({ site, children }: Props) {
  if (!site) {
    return (
      <p className="rounded-lg border border-dashed border-field-line p-5 text-muted max-lg:hidden">
        Once the site is chosen, its contacts, open jobs, and last and next visit stand here.
      </p>
    );
  }
  const { contacts = [], openJobs = [], due = [] } = site;
  return (
    <Card aria-label="The site" className="grid content-start gap-4" aria-live="polite">
      <div>
        <TextLink href={paths.site(site.id)}>{site.name}</TextLink>
        <p className="figures text-sm">
          last visit {when(site.lastVisit)} · next {when(site.nextVisit)}
        </p>
      </div>
      <Part title="Contacts" empty="No contact yet">
        {contacts.map((contact) => (
          <li key={contact.id} className="flex flex-wrap items-center justify-between gap-2">
            <span>
              <span className="font-semibold">{contact.name}</span>{" "}
              <span className="text-sm text-muted">{contact.title}</span>
              <span className="figures block text-sm">{contact.phone}</span>
            </span>
            {children(contact)}
          </li>
        ))}
      </Part>
      <Part title="Open jobs" empty="None">
        {openJobs.map((job) => (
          <li key={job.id}>
            <TextLink href={paths.job(job.id)}>
              {job.number} {job.title}
            </TextLink>
            <span className="block text-sm text-muted">{[job.stateWords, ...job.waits].join(" · ")}</span>
          </li>
        ))}
      </Part>
      <Part title="Due" empty="Nothing soon">
        {due.map((item) => (
          <li key={item.itemId}>
            {item.words}{" "}
            <span className={item.overdue ? "text-sm font-semibold text-alert" : "text-sm text-muted"}>
              {item.overdue ? "overdue since" : "by"} <span className="figures">{item.latest}</span>
            </span>
          </li>
        ))}
      </Part>
    </Card>
  );
}

const when = (local: string | null | undefined) => local?.replace("T", " ") ?? "none";

function Part({ title, empty, children }: { title: string; empty: string; children: React.ReactNode[] }) {
  return (
    <section>
      <h2 className="text-sm font-semibold text-muted">{title}</h2>
      {children.length === 0 ? <p className="text-muted">{empty}</p> : <ul className="grid gap-2">{children}</ul>}
    </section>
  );
}
