import { Mark } from "./mark";

export function PublicShell({ children }: { children: React.ReactNode }) {
  return (
    <main className="mx-auto grid min-h-dvh w-full max-w-md content-center gap-6 px-4 py-10">
      <p className="flex items-center gap-2 text-lg font-bold">
        <Mark className="size-8" />
        Coastdown
      </p>
      {children}
    </main>
  );
}
