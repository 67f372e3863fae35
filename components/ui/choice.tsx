import { cn } from "./cn";

/* Native controls: they post with the form, reset with it and work before the script has arrived. */

const box =
  "size-5 shrink-0 cursor-pointer accent-settled disabled:cursor-not-allowed aria-invalid:outline-2 aria-invalid:outline-alert";

export function Checkbox({ className, ...props }: React.ComponentProps<"input">) {
  return <input data-slot="checkbox" type="checkbox" className={cn(box, className)} {...props} />;
}

export function Radio({ className, ...props }: React.ComponentProps<"input">) {
  return <input data-slot="radio" type="radio" className={cn(box, className)} {...props} />;
}

/** On or off at once; a checkbox waits for the form. */
export function Switch({ className, ...props }: React.ComponentProps<"input">) {
  return (
    <input
      data-slot="switch"
      type="checkbox"
      // biome-ignore lint/a11y/useAriaPropsForRole: a native checkbox tells its own checked state
      role="switch"
      className={cn(
        "relative h-6 w-11 shrink-0 cursor-pointer appearance-none rounded-full border border-field-line bg-sunken transition-colors",
        "before:absolute before:top-1/2 before:left-0.5 before:size-4.5 before:-translate-y-1/2 before:rounded-full before:bg-field-line before:transition-transform",
        "checked:border-settled checked:bg-settled checked:before:translate-x-[1.15rem] checked:before:bg-on-strong",
        "disabled:cursor-not-allowed disabled:opacity-60 forced-colors:appearance-auto",
        className,
      )}
      {...props}
    />
  );
}

type ChoiceProps = React.ComponentProps<"label"> & { hint?: React.ReactNode };

/** A box with its words, all of it to be hit: put a Checkbox, Radio or Switch first, then the words. */
export function Choice({ className, hint, children, ...props }: ChoiceProps) {
  return (
    // biome-ignore lint/a11y/noLabelWithoutControl: the control is among the children
    <label
      data-slot="choice"
      className={cn("flex min-h-10 cursor-pointer items-center gap-3 pointer-coarse:min-h-12", className)}
      {...props}
    >
      {children}
      {hint && <span className="text-sm text-muted">{hint}</span>}
    </label>
  );
}

/** Radios (or boxes) that answer one question. */
export function ChoiceGroup({
  legend,
  className,
  children,
  ...props
}: React.ComponentProps<"fieldset"> & { legend: string }) {
  return (
    <fieldset data-slot="choice-group" className={cn("grid gap-x-5", className)} {...props}>
      <legend className="mb-1 font-semibold">{legend}</legend>
      {children}
    </fieldset>
  );
}
