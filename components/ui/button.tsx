import { cva, type VariantProps } from "class-variance-authority";
import { Slot } from "radix-ui";
import { cn } from "./cn";

const button = cva(
  "inline-flex cursor-pointer items-center justify-center gap-2 rounded-md border font-semibold whitespace-nowrap disabled:cursor-not-allowed disabled:opacity-60",
  {
    variants: {
      variant: {
        primary: "border-settled bg-settled text-on-strong hover:brightness-110",
        quiet: "border-field-line bg-surface text-text hover:border-text",
        danger: "border-alert bg-surface text-alert hover:bg-alert hover:text-on-strong",
        plain: "border-transparent bg-transparent text-text underline-offset-4 hover:underline",
      },
      size: {
        normal: "min-h-10 px-4 py-2",
        small: "min-h-8 px-3 py-1 text-sm",
        thumb: "min-h-12 px-5 py-3 text-base",
      },
    },
    defaultVariants: { variant: "quiet", size: "normal" },
  },
);

type ButtonProps = React.ComponentProps<"button"> & VariantProps<typeof button> & { asChild?: boolean };

export function Button({ className, variant, size, asChild, type, ...props }: ButtonProps) {
  const Part = asChild ? Slot.Root : "button";
  return (
    <Part
      data-slot="button"
      className={cn(button({ variant, size }), className)}
      {...(!asChild && { type: type ?? "button" })}
      {...props}
    />
  );
}
