import { useId } from "react";
import { Breadcrumb, type Crumb } from "@/components/ui/breadcrumb";

type PageHeaderProps = {
  title: string;
  note?: React.ReactNode;
  /** The pages above this one. */
  trail?: readonly Crumb[];
  /** Beside the title: what state the thing is in. */
  status?: React.ReactNode;
  actions?: React.ReactNode;
};

export function PageHeader({ title, note, trail, status, actions }: PageHeaderProps) {
  return (
    <header className="flex flex-wrap items-end justify-between gap-3">
      <div className="grid min-w-0 gap-1">
        {trail && <Breadcrumb trail={trail} />}
        <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <h1 className="text-2xl leading-tight font-bold text-balance wrap-anywhere">{title}</h1>
          {status}
        </div>
        {note && <p className="text-muted">{note}</p>}
      </div>
      {actions && (
        <div className="flex flex-wrap gap-2" data-print="off">
          {actions}
        </div>
      )}
    </header>
  );
}

type SectionProps = { title: string; note?: React.ReactNode; actions?: React.ReactNode; children: React.ReactNode };

export function Section({ title, note, actions, children }: SectionProps) {
  const id = useId();
  return (
    <section className="grid content-start gap-3" aria-labelledby={id}>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <div>
          <h2 id={id} className="text-lg leading-tight font-bold">
            {title}
          </h2>
          {note && <p className="text-sm text-muted">{note}</p>}
        </div>
        {actions}
      </div>
      {children}
    </section>
  );
}

/** A thing's facts, each with its term. */
export function Facts({ rows }: { rows: readonly [string, React.ReactNode][] }) {
  return (
    <dl className="grid gap-x-6 gap-y-1 sm:grid-cols-[max-content_1fr]">
      {rows.map(([term, fact]) => (
        <div key={term} className="contents">
          <dt className="text-muted max-sm:text-sm">{term}</dt>
          <dd className="min-w-0 max-sm:mb-2">{fact ?? <span className="text-muted">not recorded</span>}</dd>
        </div>
      ))}
    </dl>
  );
}
