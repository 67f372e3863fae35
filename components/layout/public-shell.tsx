import { CoastBackdrop, Mark } from "./mark";

/** For people who are not in yet: the mark, one thing to do, and calm. */
export function PublicShell({ children }: { children: React.ReactNode }) {
  return (
    <div className="relative isolate min-h-dvh overflow-hidden">
      <CoastBackdrop className="absolute inset-x-0 bottom-0 -z-10 h-[45dvh] w-full" />
      <main
        id="content"
        tabIndex={-1}
        className="mx-auto grid min-h-dvh w-full max-w-md grid-cols-[minmax(0,1fr)] content-center gap-6 px-4 py-10 outline-none"
      >
        <p className="flex items-center gap-2.5 text-xl font-bold">
          <Mark className="size-9" />
          Coastdown
        </p>
        {children}
      </main>
    </div>
  );
}
