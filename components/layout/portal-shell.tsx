import { Mark } from "./mark";
import { NavLinks } from "./nav-links";
import type { ShellProps } from "./office-shell";
import { PersonMenu } from "./person-menu";
import { SkipLink } from "./skip-link";

type PortalProps = Omit<ShellProps, "find"> & {
  /** Whom to call: stands at the foot of every page. */
  footer?: React.ReactNode;
};

/** The customer's pages: few, wide awake, and the service company's name on top. */
export function PortalShell({ companyName, personName, items, leave, footer, children }: PortalProps) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header data-print="off" className="border-b border-line bg-surface">
        <div className="mx-auto flex max-w-4xl items-center gap-3 px-4 pt-2">
          <Mark className="size-7 shrink-0" />
          <p className="mr-auto min-w-0 truncate text-lg font-bold">{companyName}</p>
          <PersonMenu personName={personName} leave={leave} />
        </div>
        <nav aria-label="Main" className="mx-auto max-w-4xl px-1">
          <NavLinks items={items} look="row" className="flex overflow-x-auto" />
        </nav>
      </header>
      <main id="content" tabIndex={-1} className="mx-auto grid w-full max-w-4xl gap-5 px-4 py-6 outline-none">
        {children}
      </main>
      {footer && (
        <footer className="mt-auto border-t border-line">
          <div className="mx-auto max-w-4xl px-4 py-4 text-sm text-muted">{footer}</div>
        </footer>
      )}
    </div>
  );
}
