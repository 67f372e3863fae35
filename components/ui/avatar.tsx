import { cn } from "./cn";

/** First letters of the first and the last name; the name itself stands beside it or is read out. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/).filter(Boolean);
  const ends = words.length > 1 ? [words[0], words.at(-1)] : words;
  return ends.map((word) => [...(word ?? "")][0]?.toLocaleUpperCase("en-US") ?? "").join("");
}

export function Avatar({ name, className, ...props }: React.ComponentProps<"span"> & { name: string }) {
  return (
    <span
      data-slot="avatar"
      aria-hidden
      className={cn(
        "inline-grid size-8 shrink-0 place-items-center rounded-full bg-settled text-sm font-bold text-on-strong select-none",
        className,
      )}
      {...props}
    >
      {initialsOf(name)}
    </span>
  );
}
