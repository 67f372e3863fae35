import { cva, type VariantProps } from "class-variance-authority";
import { Slot } from "radix-ui";
import { cn } from "./cn";
import { Spinner } from "./spinner";

const button = cva(
  "inline-flex cursor-pointer items-center justify-center gap-2 rounded-md border text-center font-semibold transition-colors disabled:cursor-not-allowed disabled:opacity-60 aria-busy:cursor-progress aria-busy:opacity-75",
  {
    variants: {
      variant: {
        primary: "border-settled bg-settled text-on-strong enabled:hover:brightness-110 [a&]:hover:brightness-110",
        quiet: "border-field-line bg-surface text-text hover:border-text hover:bg-sunken",
        danger:
          "border-alert bg-surface text-alert enabled:hover:bg-alert enabled:hover:text-on-strong [a&]:hover:bg-alert [a&]:hover:text-on-strong",
        plain: "border-transparent bg-transparent text-text hover:bg-sunken",
      },
      size: {
        normal: "min-h-10 px-4 py-1.5 pointer-coarse:min-h-12",
        small: "min-h-8 px-3 py-0.5 text-sm pointer-coarse:min-h-10",
        thumb: "min-h-12 px-5 py-2.5 text-base",
      },
      square: { true: "aspect-square p-0", false: "" },
    },
    defaultVariants: { variant: "quiet", size: "normal", square: false },
  },
);

type ButtonProps = React.ComponentProps<"button"> &
  Omit<VariantProps<typeof button>, "square"> & {
    /** Dresses its only child, usually a link. */
    asChild?: boolean;
    /** Working on it: cannot be pressed again, and says so. */
    pending?: boolean;
  };

export function Button({
  className,
  variant,
  size,
  asChild,
  pending,
  type = "button",
  onClick,
  children,
  ...props
}: ButtonProps) {
  const classes = cn(button({ variant, size }), className);
  if (asChild) {
    return (
      <Slot.Root data-slot="button" className={classes} onClick={onClick} {...props}>
        {children}
      </Slot.Root>
    );
  }
  return (
    <button
      data-slot="button"
      className={classes}
      type={type}
      // Not `disabled`: that would drop the keyboard's focus.
      aria-disabled={pending || undefined}
      aria-busy={pending || undefined}
      onClick={pending ? (event) => event.preventDefault() : onClick}
      {...props}
    >
      {pending && <Spinner />}
      {children}
    </button>
  );
}

type IconButtonProps = Omit<React.ComponentProps<"button">, "children" | "aria-label"> &
  Omit<VariantProps<typeof button>, "square"> & { label: string; children: React.ReactNode };

/** A picture alone; its label is read out and shown on hover. */
export function IconButton({ label, variant = "plain", size, className, children, ...props }: IconButtonProps) {
  return (
    <button
      data-slot="icon-button"
      type="button"
      aria-label={label}
      title={label}
      className={cn(button({ variant, size, square: true }), className)}
      {...props}
    >
      {children}
    </button>
  );
}
