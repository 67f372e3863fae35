"use client";

import { SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import { ANSWER_WORDS, ANSWERS, CHANNEL_WORDS, CHANNELS } from "@/lib/domain/visits/words";
import type { VisitDetails } from "@/lib/queries/visits";
import { formAction, usePosting } from "./use-posting";

const BY_HAND = CHANNELS.filter((channel) => channel !== "link" && channel !== "portal");

/** What somebody said on the telephone or wrote: who, when, how, and under which permit. */
export function RecordAnswer({ visit }: { visit: VisitDetails }) {
  const post = usePosting();
  const record = formAction(async (values) => {
    await post(`/api/visits/${visit.id}/answers`, values);
    return "Answer recorded";
  });
  return (
    <details>
      <summary className="cursor-pointer font-semibold">Record an answer</summary>
      <Form action={record} say="toast" className="mt-3 grid gap-3">
        <SelectField label="Who answered" name="askId">
          {visit.asks
            .filter((ask) => ask.sequence === visit.sequence)
            .map((ask) => (
              <option key={ask.id} value={ask.id}>
                {ask.name}
              </option>
            ))}
          <option value="">Somebody else</option>
        </SelectField>
        <TextField label="Name" name="name" hint="Where it was somebody else" optional />
        <SelectField label="Answer" name="answer">
          {ANSWERS.map((answer) => (
            <option key={answer} value={answer}>
              {ANSWER_WORDS[answer]}
            </option>
          ))}
        </SelectField>
        <SelectField label="How" name="channel">
          {BY_HAND.map((channel) => (
            <option key={channel} value={channel}>
              {CHANNEL_WORDS[channel]}
            </option>
          ))}
        </SelectField>
        <TextField label="When" name="answeredLocal" type="datetime-local" hint="By the clock at the site" />
        <TextField label="Permit number" name="permitNumber" optional />
        <TextareaField label="Note" name="note" optional />
        <SubmitButton>Record the answer</SubmitButton>
      </Form>
    </details>
  );
}
