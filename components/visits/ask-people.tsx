"use client";

import { Form, SubmitButton } from "@/components/form/form";
import type { VisitDetails } from "@/lib/queries/visits";
import { formAction, usePosting } from "./use-posting";

/** Asks everybody who speaks for the site and has not answered, by a letter with a link and a calendar file. */
export function AskPeople({ visit }: { visit: VisitDetails }) {
  const post = usePosting();
  const asked = visit.asks.some((ask) => ask.sequence === visit.sequence);
  const ask = formAction(async () => {
    await post(`/api/visits/${visit.id}/ask`, {});
    return "Asked";
  });
  return (
    <Form action={ask} say="toast">
      <SubmitButton variant="quiet" className="w-full">
        {asked ? "Ask again who has not answered" : "Ask who speaks for the site"}
      </SubmitButton>
    </Form>
  );
}
