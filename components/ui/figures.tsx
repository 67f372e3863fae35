import { cn } from "./cn";

/** Counts, money, times, device addresses: mono and tabular. */
export const Figures = ({ className, ...props }: React.ComponentProps<"span">) => (
  <span data-slot="figures" className={cn("figures", className)} {...props} />
);
