"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { Mark } from "@/components/layout/mark";
import { Button } from "@/components/ui/button";
import { Callout, EmptyState } from "@/components/ui/card";
import { FIELD_WORDS_EN as WORDS } from "@/lib/domain/field/words";
import { paths } from "@/lib/domain/shared/paths";
import { type FieldVisit, fieldDayQuery } from "@/lib/queries/field";
import { FieldVisitCard } from "./field-visit-card";

export function FieldToday() {
  const { data, error, refetch } = useQuery(fieldDayQuery);
  const standing = data?.visits.filter((visit) => !visit.canceledAt) ?? [];
  const isToday = (visit: FieldVisit) => visit.startsLocal.startsWith(data?.today ?? "");
  return (
    <main className="mx-auto grid max-w-xl gap-4 px-4 py-4">
      <header className="flex items-center justify-between">
        <p className="flex items-center gap-2 font-bold">
          <Mark className="size-8" />
          {data?.company.name ?? "Coastdown"}
        </p>
        <Link href={paths.account} className="flex min-h-12 items-center px-3 underline">
          {WORDS.account}
        </Link>
      </header>
      <h1 className="text-2xl font-bold">{WORDS.today}</h1>
      {error && (
        <Callout tone="alert">
          <p>
            {WORDS.failed}: {error.message}
          </p>
          <Button size="thumb" onClick={() => refetch()}>
            {WORDS.tryAgain}
          </Button>
        </Callout>
      )}
      {!data && !error && <p>{WORDS.loading}</p>}
      {data && (
        <>
          <List visits={standing.filter(isToday)} none={WORDS.nothingToday} more={WORDS.nothingTodayNext} />
          <h2 className="text-lg font-bold">{WORDS.later}</h2>
          <List visits={standing.filter((visit) => !isToday(visit))} none={WORDS.nothingLater} />
        </>
      )}
    </main>
  );
}

function List({ visits, none, more }: { visits: FieldVisit[]; none: string; more?: string }) {
  if (visits.length === 0) return <EmptyState title={none}>{more}</EmptyState>;
  return (
    <ol className="grid gap-3">
      {visits.map((visit) => (
        <li key={visit.id}>
          <FieldVisitCard visit={visit} />
        </li>
      ))}
    </ol>
  );
}
