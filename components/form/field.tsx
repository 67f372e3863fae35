"use client";

import { use, useId } from "react";
import { Checkbox as CheckboxBox, Choice, ChoiceGroup, Radio, Switch } from "@/components/ui/choice";
import { Input, Select, Textarea } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import { FormStateContext } from "./form-context";

export type FieldProps = { label: string; name: string; hint?: React.ReactNode; defaultValue?: string | null };

type Control = {
  id: string;
  name: string;
  defaultValue?: string;
  required?: boolean;
  "aria-invalid"?: true;
  "aria-describedby"?: string;
};

/** Label, hint, error and their wiring, once; what was typed comes back with a refusal. */
function useField({ name, hint, defaultValue }: Omit<FieldProps, "label">) {
  const state = use(FormStateContext);
  const id = useId();
  const errors = state.fieldErrors?.[name];
  const described = [hint && `${id}-hint`, errors && `${id}-error`].filter(Boolean).join(" ");
  const control: Control = {
    id,
    name,
    defaultValue: state.values?.[name] ?? defaultValue ?? undefined,
    "aria-invalid": errors ? true : undefined,
    "aria-describedby": described || undefined,
  };
  return { state, errors, control };
}

const Hint = ({ id, children }: { id: string; children: React.ReactNode }) =>
  children ? (
    <p id={`${id}-hint`} className="text-sm text-muted">
      {children}
    </p>
  ) : null;

const Errors = ({ id, errors }: { id: string; errors?: string[] }) =>
  errors ? (
    <p id={`${id}-error`} className="text-sm font-semibold text-alert">
      {errors.join(". ")}
    </p>
  ) : null;

type CustomProps = FieldProps & { optional?: boolean; children: (control: Control) => React.ReactNode };

/** Any control in a field: spread what it is given onto the control. */
export function Field({ label, hint, optional, children, ...props }: CustomProps) {
  const { errors, control } = useField({ hint, ...props });
  return (
    <div data-slot="field" className="grid content-start gap-1">
      <Label htmlFor={control.id}>
        {label}
        {optional && <span className="font-normal text-muted"> (optional)</span>}
      </Label>
      <Hint id={control.id}>{hint}</Hint>
      {children(control)}
      <Errors id={control.id} errors={errors} />
    </div>
  );
}

type Rest<T extends "input" | "select" | "textarea"> = Omit<React.ComponentProps<T>, "name" | "defaultValue"> & {
  optional?: boolean;
};

export function TextField({ label, name, hint, defaultValue, optional, ...rest }: FieldProps & Rest<"input">) {
  return (
    <Field {...{ label, name, hint, defaultValue, optional }}>{(control) => <Input {...control} {...rest} />}</Field>
  );
}

export function TextareaField({ label, name, hint, defaultValue, optional, ...rest }: FieldProps & Rest<"textarea">) {
  return (
    <Field {...{ label, name, hint, defaultValue, optional }}>{(control) => <Textarea {...control} {...rest} />}</Field>
  );
}

export function SelectField({ label, name, hint, defaultValue, optional, ...rest }: FieldProps & Rest<"select">) {
  return (
    <Field {...{ label, name, hint, defaultValue, optional }}>
      {/* A list ignores a changed default; a new key does not. */}
      {(control) => <Select key={control.defaultValue} {...control} {...rest} />}
    </Field>
  );
}

type BoxProps = Omit<FieldProps, "defaultValue"> & Rest<"input"> & { as?: "checkbox" | "switch" };

/** One yes or no. */
export function CheckboxField({ label, name, hint, as = "checkbox", defaultChecked, ...rest }: BoxProps) {
  const { state, errors, control } = useField({ name, hint });
  const Box = as === "switch" ? Switch : CheckboxBox;
  return (
    <div data-slot="field" className="grid gap-1">
      <Choice>
        <Box {...control} defaultChecked={state.values ? name in state.values : defaultChecked} {...rest} />
        {label}
      </Choice>
      <Hint id={control.id}>{hint}</Hint>
      <Errors id={control.id} errors={errors} />
    </div>
  );
}

type RadioProps = FieldProps & { options: readonly { value: string; label: string; hint?: string }[] };

/** One question whose few answers are all worth showing. */
export function RadioField({ label, name, hint, defaultValue, options }: RadioProps) {
  const { errors, control } = useField({ name, hint, defaultValue });
  const { defaultValue: chosen, id, ...shared } = control;
  return (
    <ChoiceGroup legend={label} data-slot="field" aria-describedby={shared["aria-describedby"]}>
      <Hint id={id}>{hint}</Hint>
      {options.map((option) => (
        <Choice key={option.value} hint={option.hint}>
          <Radio {...shared} value={option.value} defaultChecked={option.value === chosen} />
          {option.label}
        </Choice>
      ))}
      <Errors id={id} errors={errors} />
    </ChoiceGroup>
  );
}
