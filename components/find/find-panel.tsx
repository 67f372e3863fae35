"use client";

import { useQuery } from "@tanstack/react-query";
import { Command } from "cmdk";
import { useRouter } from "next/navigation";
import { useDeferredValue, useState } from "react";
import type { Found } from "@/lib/domain/shared/found";
import { paths } from "@/lib/domain/shared/paths";
import { findQuery } from "@/lib/queries/find";
import { FOUND, FoundSite } from "./found-site";

export function FindPanel({ onGo }: { onGo: () => void }) {
  const [typed, setTyped] = useState("");
  const q = useDeferredValue(typed.trim());
  const { data, isFetching, error } = useQuery(findQuery(q));
  const router = useRouter();
  const go = (href: string) => {
    onGo();
    router.push(href);
  };
  return (
    <Command shouldFilter={false} label="Find" className="contents">
      <Command.Input
        autoFocus
        value={typed}
        onValueChange={setTyped}
        placeholder="Name, street, telephone or job number"
        className="min-h-12 w-full rounded-md border border-field-line bg-surface px-3 text-lg"
      />
      <Command.List className="min-h-40 overflow-y-auto">
        {error && <p className="p-3 text-alert">{error.message}</p>}
        {q.length < 2 && <p className="p-3 text-muted">Type two letters or more.</p>}
        {q.length >= 2 && data && <Results found={data} go={go} />}
        {q.length >= 2 && !data && isFetching && <p className="p-3 text-muted">Looking…</p>}
      </Command.List>
    </Command>
  );
}

function Results({ found, go }: { found: Found; go: (href: string) => void }) {
  if (Object.values(found).every((rows) => rows.length === 0)) return <p className="p-3">Nothing by that name.</p>;
  return (
    <>
      {found.sites.map((site) => (
        <FoundSite key={site.id} site={site} go={go} />
      ))}
      {found.customers.map((row) => (
        <Line key={row.id} id={row.id} kind="Customer" words={row.name} onSelect={() => go(paths.customer(row.id))} />
      ))}
      {found.contacts.map((row) => (
        <Line
          key={row.id}
          id={row.id}
          kind="Contact"
          words={`${row.name} ${row.phone ?? ""}`}
          onSelect={() => go(paths.customer(row.customerId))}
        />
      ))}
      {found.jobs.map((row) => (
        <Line
          key={row.id}
          id={row.id}
          kind={`Job ${row.number}`}
          words={row.title}
          onSelect={() => go(paths.job(row.id))}
        />
      ))}
      {found.people.map((row) => (
        <Line key={row.id} id={row.id} kind="Person" words={row.name} onSelect={() => go(paths.person(row.id))} />
      ))}
    </>
  );
}

function Line({ id, kind, words, onSelect }: { id: string; kind: string; words: string; onSelect: () => void }) {
  return (
    <Command.Item value={id} onSelect={onSelect} className={FOUND}>
      <span className="text-sm text-muted">{kind}</span> <span className="font-semibold">{words}</span>
    </Command.Item>
  );
}
