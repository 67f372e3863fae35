/** The first stop of the keyboard, to the page's own content. */
export function SkipLink({ children = "Skip to content" }: { children?: React.ReactNode }) {
  return (
    <a
      href="#content"
      data-print="off"
      className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:rounded-md focus:bg-surface focus:px-4 focus:py-3 focus:font-semibold focus:shadow-lg"
    >
      {children}
    </a>
  );
}
