"use client";

import { useRef } from "react";
import { Button } from "@/components/ui/button";
import { ConfirmDialog } from "@/components/ui/dialog";
import { Form, type FormAction, SubmitButton } from "./form";

type RowProps = {
  action: FormAction;
  name: string;
  value: string;
  button: string;
  danger?: boolean;
  /** What a step that cannot be undone asks first. */
  confirm?: { title: string; description: React.ReactNode };
};

/** One button that does one thing to one row. */
export function RowAction({ action, name, value, button, danger, confirm }: RowProps) {
  const field = useRef<HTMLInputElement>(null);
  const variant = danger ? "danger" : "quiet";
  return (
    <Form action={action} className="relative inline-grid gap-2 justify-self-start">
      <input ref={field} type="hidden" name={name} value={value} />
      {confirm ? (
        <ConfirmDialog
          {...confirm}
          trigger={
            <Button variant={variant} size="small">
              {button}
            </Button>
          }
          confirm={button}
          onConfirm={() => field.current?.form?.requestSubmit()}
        />
      ) : (
        <SubmitButton variant={variant} size="small">
          {button}
        </SubmitButton>
      )}
    </Form>
  );
}
