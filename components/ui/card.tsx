import { cn } from "./cn";

export function Card({ className, ...props }: React.ComponentProps<"section">) {
  return (
    <section
      data-slot="card"
      className={cn("rounded-lg border border-line bg-surface p-4 sm:p-5", className)}
      {...props}
    />
  );
}

export function EmptyState({ title, children }: { title: string; children?: React.ReactNode }) {
  return (
    <div data-slot="empty" className="rounded-lg border border-dashed border-field-line p-6 text-center">
      <p className="font-semibold">{title}</p>
      {children && <div className="mt-1 text-muted">{children}</div>}
    </div>
  );
}

export function Callout({
  tone = "neutral",
  children,
}: {
  tone?: "neutral" | "alert" | "soon";
  children: React.ReactNode;
}) {
  const edge = { neutral: "border-l-settled", alert: "border-l-alert", soon: "border-l-soon" }[tone];
  return (
    <div data-slot="callout" className={cn("rounded-md border border-line border-l-4 bg-surface px-4 py-3", edge)}>
      {children}
    </div>
  );
}
