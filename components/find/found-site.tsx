"use client";

import { Command } from "cmdk";
import type { SiteBrief } from "@/lib/domain/shared/found";
import { paths } from "@/lib/domain/shared/paths";

export const FOUND =
  "cursor-pointer rounded-md px-3 py-2 aria-selected:bg-ground aria-selected:shadow-[inset_3px_0_0_var(--still)]";

const when = (local: string | null) => local?.replace("T", " ") ?? "none";

type Props = { site: SiteBrief; go: (href: string) => void };

/** A site, whom to call there, what is open, and the way to a new call. */
export function FoundSite({ site, go }: Props) {
  return (
    <>
      <Command.Item value={site.id} onSelect={() => go(paths.site(site.id))} className={FOUND}>
        <span className="font-semibold">{site.name}</span>
        <span className="block text-sm text-muted">
          {site.street}, {site.city}
        </span>
        <span className="figures block text-sm">
          last {when(site.lastVisit)} · next {when(site.nextVisit)}
        </span>
        {site.contacts.map((contact) => (
          <span key={contact.id} className="block text-sm">
            {contact.name} <span className="figures">{contact.phone}</span>
          </span>
        ))}
      </Command.Item>
      {site.openJobs.map((job) => (
        <Command.Item
          key={job.id}
          value={`${site.id} ${job.id}`}
          onSelect={() => go(paths.job(job.id))}
          className={`${FOUND} ml-5 text-sm`}
        >
          <span className="figures text-muted">{job.number}</span> {job.title}
          <span className="text-muted"> · {[job.stateWords.toLowerCase(), ...job.waits].join(" · ")}</span>
        </Command.Item>
      ))}
      {site.due.map((item) => (
        <Command.Item
          key={item.itemId}
          value={`${site.id} ${item.itemId}`}
          onSelect={() => go(`${paths.dueList}?site=${site.id}`)}
          className={`${FOUND} ml-5 text-sm`}
        >
          {item.words}
          <span className={item.overdue ? "font-semibold text-alert" : "text-muted"}>
            {" "}
            · {item.overdue ? "overdue since" : "due by"} <span className="figures">{item.latest}</span>
          </span>
        </Command.Item>
      ))}
      <Command.Item
        value={`${site.id} call`}
        onSelect={() => go(paths.newJob(site.id))}
        className={`${FOUND} ml-5 text-sm`}
      >
        New call for this site
      </Command.Item>
    </>
  );
}
