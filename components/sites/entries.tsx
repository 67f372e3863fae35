import { Card } from "@/components/ui/card";

/** A short list of what a site has, each with what can be done to it. */
export const Entries = ({ children }: { children: React.ReactNode }) => (
  <Card className="p-0 sm:p-0">
    <ul>{children}</ul>
  </Card>
);

type EntryProps = { title: React.ReactNode; children?: React.ReactNode; actions?: React.ReactNode };

export const Entry = ({ title, children, actions }: EntryProps) => (
  <li className="flex flex-wrap items-start justify-between gap-x-4 gap-y-2 border-line px-4 py-2.5 not-last:border-b">
    <div className="min-w-0 flex-1 basis-60">
      <p className="font-semibold">{title}</p>
      {children && <div className="grid gap-0.5 text-sm text-muted">{children}</div>}
    </div>
    {actions && (
      <div className="flex flex-wrap items-start gap-2" data-print="off">
        {actions}
      </div>
    )}
  </li>
);

export const Nothing = ({ children }: { children: React.ReactNode }) => (
  <p className="rounded-lg border border-dashed border-field-line px-4 py-3 text-muted">{children}</p>
);

/** A telephone number to press. */
export const Call = ({ phone }: { phone: string | null }) =>
  phone ? (
    <a href={`tel:${phone}`} className="figures inline-flex min-h-6 items-center underline">
      {phone}
    </a>
  ) : null;
