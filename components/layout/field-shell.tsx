import { type NavItem, NavLinks } from "./nav-links";
import { SkipLink } from "./skip-link";

type FieldShellProps = {
  title: string;
  /** Beside the title: where back leads, or the person. */
  corner?: React.ReactNode;
  /** What is not in its normal state: stays on top, whatever is scrolled. */
  top?: React.ReactNode;
  items: readonly NavItem[];
  /** Every word comes from the caller's message file. */
  words: { skip: string; main: string };
  children: React.ReactNode;
};

/** One thumb, one task: the navigation lies at the bottom, every target is 48 px or more. */
export function FieldShell({ title, corner, top, items, words, children }: FieldShellProps) {
  return (
    <div className="flex min-h-dvh flex-col text-base">
      <SkipLink>{words.skip}</SkipLink>
      <div className="sticky top-0 z-20 bg-ground pt-[env(safe-area-inset-top)]">
        {top}
        <header className="mx-auto flex min-h-14 max-w-xl items-center justify-between gap-3 border-b border-line px-4">
          <h1 className="min-w-0 truncate text-xl font-bold">{title}</h1>
          {corner}
        </header>
      </div>
      <main
        id="content"
        tabIndex={-1}
        className="mx-auto grid w-full max-w-xl grow content-start gap-4 px-4 py-4 outline-none"
      >
        {children}
      </main>
      {items.length > 0 && (
        <nav
          aria-label={words.main}
          className="sticky bottom-0 z-20 border-t border-line bg-surface pb-[env(safe-area-inset-bottom)]"
        >
          <NavLinks items={items} look="bar" className="mx-auto flex max-w-xl" />
        </nav>
      )}
    </div>
  );
}
