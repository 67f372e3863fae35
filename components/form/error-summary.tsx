"use client";

import { useEffect, useState } from "react";
import { Callout } from "@/components/ui/card";
import type { FormState } from "@/lib/domain/shared/form-state";

type Problem = { name: string; text: string; label?: string };

function controlNamed(form: HTMLFormElement, name: string): HTMLInputElement | null {
  const found = form.elements.namedItem(name);
  const control = (found instanceof RadioNodeList ? found[0] : found) as HTMLInputElement | null;
  return control?.type === "hidden" ? null : control;
}

/** Each refused field under the label it has on the page; what the page does not show has its message alone. */
const problemsOf = (form: HTMLFormElement, fieldErrors: Record<string, string[]>): Problem[] =>
  Object.entries(fieldErrors).map(([name, messages]) => {
    const control = controlNamed(form, name);
    const words = control?.closest("fieldset")?.querySelector("legend") ?? control?.labels?.[0];
    return { name, text: messages.join(". "), label: control ? (words?.textContent ?? name) : undefined };
  });

type Props = { state: FormState; form: React.RefObject<HTMLFormElement | null>; ref: React.Ref<HTMLDivElement> };

/** What was refused and why, above the fields; takes the focus when no field on the page is to blame. */
export function ErrorSummary({ state, form, ref }: Props) {
  const [problems, setProblems] = useState<Problem[]>([]);
  useEffect(() => {
    setProblems(form.current && !state.ok ? problemsOf(form.current, state.fieldErrors ?? {}) : []);
  }, [state, form]);
  if (state.ok || (!state.message && problems.length === 0)) return null;
  const listed = problems.length > 1 || problems.some((problem) => !problem.label);
  return (
    <Callout tone="alert" role="alert" tabIndex={-1} ref={ref} data-slot="error-summary" title={state.message}>
      {listed && (
        <ul className="grid gap-1">
          {problems.map(({ name, label, text }) => (
            <li key={name}>
              {label && (
                <button
                  type="button"
                  className="cursor-pointer font-semibold underline"
                  onClick={() => form.current && controlNamed(form.current, name)?.focus()}
                >
                  {label}
                </button>
              )}
              {label ? `: ${text}` : text}
            </li>
          ))}
        </ul>
      )}
    </Callout>
  );
}
