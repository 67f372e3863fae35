import { CircleAlert, Info, TriangleAlert } from "lucide-react";
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

type EmptyProps = { title: string; children?: React.ReactNode; action?: React.ReactNode };

/** Says that there is nothing, what that means or what to do next, and offers to do it. */
export function EmptyState({ title, children, action }: EmptyProps) {
  return (
    <div data-slot="empty" className="rounded-lg border border-dashed border-field-line px-6 py-8 text-center">
      <p className="font-semibold">{title}</p>
      {children && <div className="mx-auto mt-1 max-w-prose text-muted">{children}</div>}
      {action && <div className="mt-4 flex flex-wrap justify-center gap-2">{action}</div>}
    </div>
  );
}

const CALLOUTS = {
  neutral: { look: "border-l-settled", glyph: "text-settled", Glyph: Info },
  soon: { look: "border-l-soon bg-soon-soft", glyph: "text-soon", Glyph: TriangleAlert },
  alert: { look: "border-l-alert bg-alert-soft", glyph: "text-alert", Glyph: CircleAlert },
} as const;

type CalloutProps = Omit<React.ComponentProps<"div">, "title"> & { tone?: keyof typeof CALLOUTS; title?: string };

/** A notice (neutral), a caution (soon), or something that is wrong now (alert). */
export function Callout({ tone = "neutral", title, className, children, ...props }: CalloutProps) {
  const { look, glyph, Glyph } = CALLOUTS[tone];
  return (
    <div
      data-slot="callout"
      className={cn("flex gap-3 rounded-md border border-l-4 border-line bg-surface px-4 py-3", look, className)}
      {...props}
    >
      <Glyph aria-hidden className={cn("mt-0.5 size-5 shrink-0", glyph)} />
      <div className="grid min-w-0 gap-2">
        {title && <p className="font-semibold">{title}</p>}
        {children}
      </div>
    </div>
  );
}
