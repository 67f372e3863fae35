"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { FieldShell } from "@/components/layout/field-shell";
import { Button } from "@/components/ui/button";
import { Callout, EmptyState } from "@/components/ui/card";
import { PageSkeleton } from "@/components/ui/skeleton";
import { FIELD_WORDS_EN as WORDS } from "@/lib/domain/field/words";
import { paths } from "@/lib/domain/shared/paths";
import { type FieldVisit, fieldDayQuery } from "@/lib/queries/field";
import { FieldVisitCard } from "./field-visit-card";

export function FieldToday() {
  const { data, error, refetch } = useQuery(fieldDayQuery);
  const standing = data?.visits.filter((visit) => !visit.canceledAt) ?? [];
  const isToday = (visit: FieldVisit) => visit.startsLocal.startsWith(data?.today ?? "");
  return (
    <FieldShell
      title={WORDS.today}
      corner={
        <Link href={paths.account} className="flex min-h-12 items-center px-3 font-semibold underline">
          {WORDS.account}
        </Link>
      }
      items={[]}
      words={{ skip: WORDS.skip, main: WORDS.main }}
    >
      {data && <p className="text-muted">{data.company.name}</p>}
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
      {!data && !error && <PageSkeleton label={WORDS.loading} />}
      {data && (
        <>
          <List
            visits={standing.filter(isToday)}
            none={WORDS.nothingToday}
            more={WORDS.nothingTodayNext}
            heading="h2"
          />
          <h2 className="text-lg font-bold">{WORDS.later}</h2>
          <List visits={standing.filter((visit) => !isToday(visit))} none={WORDS.nothingLater} heading="h3" />
        </>
      )}
    </FieldShell>
  );
}

type ListProps = { visits: FieldVisit[]; none: string; more?: string; heading: "h2" | "h3" };

function List({ visits, none, more, heading }: ListProps) {
  if (visits.length === 0) return <EmptyState title={none}>{more}</EmptyState>;
  return (
    <ol className="grid gap-3">
      {visits.map((visit) => (
        <li key={visit.id}>
          <FieldVisitCard visit={visit} heading={heading} showDay={heading === "h3"} />
        </li>
      ))}
    </ol>
  );
}
