"use client";

import { TextareaField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";

/** Nothing is answered before a button is pressed: programs that look through mail open links, and press nothing. */
export function AnswerForm({ action, name, value }: { action: FormAction; name: "token" | "askId"; value: string }) {
  return (
    <Form action={action} className="grid gap-4" data-print="off">
      <input type="hidden" name={name} value={value} />
      <TextField
        label="Permit or approval number"
        name="permitNumber"
        optional
        hint="If the building gives one for this work, for example for hot work or a shutdown."
      />
      <TextareaField label="A word to us" name="note" optional hint="What stands in the way, or what we should know." />
      <div className="flex flex-wrap gap-3">
        <SubmitButton size="thumb" name="answer" value="acknowledged">
          Acknowledge
        </SubmitButton>
        <SubmitButton size="thumb" variant="danger" name="answer" value="declined">
          Decline
        </SubmitButton>
      </div>
    </Form>
  );
}
