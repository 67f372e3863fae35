import { Mark } from "./mark";
import { type NavItem, NavLinks } from "./nav-links";
import { PersonMenu } from "./person-menu";
import { PhoneNav } from "./phone-nav";
import { SkipLink } from "./skip-link";

export type ShellProps = {
  companyName: string;
  personName: string;
  items: readonly NavItem[];
  /** The search button that opens from anywhere. */
  find?: React.ReactNode;
  leave: () => Promise<void>;
  children: React.ReactNode;
};

/** The office: a slim rail at a desk, a bar under the thumb on a phone. */
export function OfficeShell({ companyName, personName, items, find, leave, children }: ShellProps) {
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[12.5rem_1fr] print:block">
      <SkipLink />
      <aside
        data-print="off"
        className="sticky top-0 hidden h-dvh content-start gap-4 overflow-y-auto border-r border-line bg-surface p-3 lg:grid"
      >
        <p className="flex items-center gap-2 px-2 pt-1 text-lg font-bold">
          <Mark className="size-7" />
          Coastdown
        </p>
        <nav aria-label="Main">
          <NavLinks items={items} className="grid gap-0.5" />
        </nav>
      </aside>
      <div className="min-w-0 max-lg:pb-20 print:pb-0">
        <header
          data-print="off"
          className="sticky top-0 z-20 flex min-h-14 items-center gap-3 border-b border-line bg-ground px-4 py-1.5"
        >
          <Mark className="size-7 shrink-0 lg:hidden" />
          <p className="mr-auto min-w-0 truncate font-semibold">{companyName}</p>
          {find}
          <PersonMenu personName={personName} leave={leave} />
        </header>
        <main
          id="content"
          tabIndex={-1}
          className="mx-auto grid w-full max-w-7xl gap-5 px-4 py-6 outline-none print:p-0"
        >
          {children}
        </main>
      </div>
      <PhoneNav items={items} />
    </div>
  );
}
