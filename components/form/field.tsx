"use client";

import { createContext, use, useId } from "react";
import { Input, Select, Textarea } from "@/components/ui/input";
import type { FormState } from "@/lib/domain/shared/form-state";

export const FormStateContext = createContext<FormState>({ ok: false });

type FieldProps = { label: string; name: string; hint?: string; defaultValue?: string | null };

/** Label, hint, error and their wiring, once; what was typed comes back with a refusal. */
function useField({ name, hint, defaultValue }: FieldProps) {
  const state = use(FormStateContext);
  const id = useId();
  const errors = state.fieldErrors?.[name];
  const described = [hint && `${id}-hint`, errors && `${id}-error`].filter(Boolean).join(" ");
  return {
    id,
    errors,
    control: {
      id,
      name,
      defaultValue: state.values?.[name] ?? defaultValue ?? undefined,
      "aria-invalid": errors ? true : undefined,
      "aria-describedby": described || undefined,
    },
  };
}

function Frame({
  id,
  label,
  hint,
  errors,
  children,
}: {
  id: string;
  label: string;
  hint?: string;
  errors?: string[];
  children: React.ReactNode;
}) {
  return (
    <div data-slot="field" className="grid gap-1">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-muted">
          {hint}
        </p>
      )}
      {children}
      {errors && (
        <p id={`${id}-error`} className="text-sm font-semibold text-alert">
          {errors.join(". ")}
        </p>
      )}
    </div>
  );
}

type Rest<T extends "input" | "select" | "textarea"> = Omit<React.ComponentProps<T>, "name" | "defaultValue">;

export function TextField({ label, name, hint, defaultValue, ...rest }: FieldProps & Rest<"input">) {
  const { id, errors, control } = useField({ label, name, hint, defaultValue });
  return (
    <Frame id={id} label={label} hint={hint} errors={errors}>
      <Input {...control} {...rest} />
    </Frame>
  );
}

export function TextareaField({ label, name, hint, defaultValue, ...rest }: FieldProps & Rest<"textarea">) {
  const { id, errors, control } = useField({ label, name, hint, defaultValue });
  return (
    <Frame id={id} label={label} hint={hint} errors={errors}>
      <Textarea {...control} {...rest} />
    </Frame>
  );
}

export function SelectField({ label, name, hint, defaultValue, children, ...rest }: FieldProps & Rest<"select">) {
  const { id, errors, control } = useField({ label, name, hint, defaultValue });
  return (
    <Frame id={id} label={label} hint={hint} errors={errors}>
      <Select {...control} {...rest}>
        {children}
      </Select>
    </Frame>
  );
}
