import type { Metadata } from "next";
import Link from "next/link";
import { may } from "@/app/frame";
import { PageHeader } from "@/components/layout/page-header";
import { Button } from "@/components/ui/button";
import { RunSheet } from "@/components/visits/run-sheet";
import { paths } from "@/lib/domain/shared/paths";
import { addDays, dateWords } from "@/lib/domain/shared/zone";
import { getRunSheet } from "@/lib/services/visits/get-run-sheet";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Run sheet" };

export default async function RunSheetPage({ searchParams }: PageProps<"/run-sheet">) {
  const { date } = await searchParams;
  const sheet = await read(getRunSheet, { date });
  const to = (day: string, word: string) => (
    <Button asChild>
      <Link href={paths.runSheet(day)}>{word}</Link>
    </Button>
  );
  return (
    <>
      <PageHeader
        title={`Run sheet, ${dateWords(sheet.date)}`}
        note={`${sheet.visits.filter((visit) => !visit.canceledAt).length} visits`}
        actions={
          <>
            {to(addDays(sheet.date, -1), "Day before")}
            {to(sheet.today, "Today")}
            {to(addDays(sheet.date, 1), "Day after")}
          </>
        }
      />
      <RunSheet key={sheet.date} initial={sheet} mayWrite={await may("visit:write")} />
    </>
  );
}
