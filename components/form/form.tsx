"use client";

import { startTransition, useActionState, useEffect, useRef } from "react";
import { useFormStatus } from "react-dom";
import { toast } from "sonner";
import { Button } from "@/components/ui/button";
import { cn } from "@/components/ui/cn";
import type { FormState } from "@/lib/domain/shared/form-state";
import { ErrorSummary } from "./error-summary";
import { FormStateContext } from "./form-context";

export type FormAction = (state: FormState, form: FormData) => Promise<FormState>;

type FormProps = Omit<React.ComponentProps<"form">, "action" | "onSubmit"> & {
  action: FormAction;
  /** How success is told: in the form, or passing by where the form goes away. */
  say?: "here" | "toast";
  onDone?: (state: FormState) => void;
};

/** A form that keeps what was typed, says what happened, and puts the cursor on the first field to mend. */
export function Form({ action, say = "here", onDone, children, ...props }: FormProps) {
  const [state, send, pending] = useActionState(action, { ok: false });
  const form = useRef<HTMLFormElement>(null);
  const summary = useRef<HTMLDivElement>(null);
  const told = useRef<FormState>(state);

  // Sent by hand, React does not empty the form; before the script arrives, the plain action does the work.
  const submit = (event: React.SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (pending) return;
    const data = new FormData(event.currentTarget, event.nativeEvent.submitter);
    startTransition(() => send(data));
  };

  useEffect(() => {
    if (told.current === state) return;
    told.current = state;
    if (state.ok) {
      form.current?.reset();
      if (say === "toast" && state.message) toast.success(state.message);
      onDone?.(state);
    } else {
      const bad = form.current?.querySelector<HTMLElement>("[aria-invalid=true]");
      (bad ?? summary.current)?.focus();
    }
  }, [state, say, onDone]);

  return (
    <FormStateContext value={state}>
      <form ref={form} action={send} onSubmit={submit} noValidate {...props}>
        <ErrorSummary state={state} form={form} ref={summary} />
        <p role="status" className="font-semibold text-settled empty:absolute">
          {state.ok && say === "here" && state.message}
        </p>
        {children}
      </form>
    </FormStateContext>
  );
}

/** As wide as its words at a desk, as the form on a phone and where it is the page's one step. */
export function SubmitButton({ className, ...props }: React.ComponentProps<typeof Button>) {
  const { pending } = useFormStatus();
  const width = props.size !== "thumb" && "sm:justify-self-start";
  return <Button type="submit" variant="primary" pending={pending} className={cn(width, className)} {...props} />;
}
