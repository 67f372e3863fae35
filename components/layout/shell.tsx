import Link from "next/link";
import { Mark } from "./mark";
import { type NavItem, NavLinks } from "./nav-links";

type ShellProps = {
  companyName: string;
  personName: string;
  items: readonly NavItem[];
  find?: React.ReactNode;
  leave: () => Promise<void>;
  children: React.ReactNode;
};

/** The frame of a signed-in person's pages: a rail at a desk, a scrolling strip on a phone. */
export function Shell({ companyName, personName, items, find, leave, children }: ShellProps) {
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[13rem_1fr]">
      <a href="#content" className="sr-only focus:not-sr-only focus:absolute focus:z-50 focus:bg-surface focus:p-3">
        Skip to content
      </a>
      <aside data-print="off" className="border-line bg-surface max-lg:border-b lg:border-r lg:p-3">
        <p className="flex items-center gap-2 px-3 py-3 font-bold">
          <Mark className="size-7" />
          {companyName}
        </p>
        <nav aria-label="Main">
          <NavLinks items={items} className="flex gap-1 overflow-x-auto px-2 pb-2 lg:grid lg:px-0" />
        </nav>
      </aside>
      <div className="min-w-0">
        <header
          data-print="off"
          className="flex flex-wrap items-center justify-between gap-3 border-b border-line px-4 py-2"
        >
          <div>{find}</div>
          <div className="flex items-center gap-2">
            <Link href="/account" className="flex min-h-10 items-center px-2 font-semibold hover:underline">
              {personName}
            </Link>
            <form action={leave}>
              <button type="submit" className="min-h-10 cursor-pointer px-2 text-muted hover:text-text hover:underline">
                Sign out
              </button>
            </form>
          </div>
        </header>
        <main id="content" className="mx-auto grid w-full max-w-7xl gap-5 px-4 py-6">
          {children}
        </main>
      </div>
    </div>
  );
}
