import { cn } from "./cn";

/** Holds the place of what is still coming. */
export function Skeleton({ className, ...props }: React.ComponentProps<"div">) {
  return (
    <div data-slot="skeleton" aria-hidden className={cn("animate-pulse rounded-md bg-line", className)} {...props} />
  );
}

/** A list page that is still coming. */
export function PageSkeleton({ label = "Loading" }: { label?: string }) {
  return (
    <div role="status" className="grid gap-4">
      <span className="sr-only">{label}</span>
      <Skeleton className="h-8 w-56" />
      <Skeleton className="h-10 w-full max-w-sm" />
      <Skeleton className="h-72 w-full" />
    </div>
  );
}
