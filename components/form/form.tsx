"use client";

import { useActionState, useEffect, useRef } from "react";
import { useFormStatus } from "react-dom";
import { Button } from "@/components/ui/button";
import type { FormState } from "@/lib/domain/shared/form-state";
import { FormStateContext } from "./field";

export type FormAction = (state: FormState, form: FormData) => Promise<FormState>;

type FormProps = Omit<React.ComponentProps<"form">, "action"> & { action: FormAction };

/** A form that keeps what was typed, says what happened, and puts the cursor on the first field to mend. */
export function Form({ action, children, ...props }: FormProps) {
  const [state, submit] = useActionState(action, { ok: false });
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (state.at && !state.ok) form.current?.querySelector<HTMLElement>("[aria-invalid=true]")?.focus();
  }, [state]);
  return (
    <FormStateContext value={state}>
      {/* A new key takes the returned values as new defaults. */}
      <form key={state.ok ? state.at : "same"} ref={form} action={submit} noValidate {...props}>
        {state.message && (
          <p
            role={state.ok ? "status" : "alert"}
            className={state.ok ? "text-settled font-semibold" : "text-alert font-semibold"}
          >
            {state.message}
          </p>
        )}
        {children}
      </form>
    </FormStateContext>
  );
}

export function SubmitButton({ children, ...props }: React.ComponentProps<typeof Button>) {
  const { pending } = useFormStatus();
  return (
    <Button type="submit" variant="primary" {...props} disabled={pending || props.disabled} aria-busy={pending}>
      {pending ? "One moment…" : children}
    </Button>
  );
}
