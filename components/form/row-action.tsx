"use client";

import { Form, type FormAction, SubmitButton } from "./form";

type RowProps = { action: FormAction; name: string; value: string; button: string; danger?: boolean };

/** One button that does one thing to one row. */
export function RowAction({ action, name, value, button, danger }: RowProps) {
  return (
    <Form action={action} className="inline-grid">
      <input type="hidden" name={name} value={value} />
      <SubmitButton variant={danger ? "danger" : "quiet"} size="small">
        {button}
      </SubmitButton>
    </Form>
  );
}
