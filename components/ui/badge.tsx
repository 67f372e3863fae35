import { CircleAlert, CircleCheck, Clock3, Minus } from "lucide-react";
import { cn } from "./cn";

const TONES = {
  settled: { look: "border-settled bg-settled-soft text-settled", Glyph: CircleCheck },
  alert: { look: "border-alert bg-alert-soft text-alert", Glyph: CircleAlert },
  soon: { look: "border-soon bg-soon-soft text-soon", Glyph: Clock3 },
  neutral: { look: "border-field-line bg-surface text-muted", Glyph: Minus },
} as const;
export type Tone = keyof typeof TONES;

type BadgeProps = React.ComponentProps<"span"> & { tone?: Tone };

/** Never color alone: a glyph and a word go with it. */
export function Badge({ tone = "neutral", className, children, ...props }: BadgeProps) {
  const { look, Glyph } = TONES[tone];
  return (
    <span
      data-slot="badge"
      className={cn(
        "inline-flex items-center gap-1 rounded-full border px-2 py-px text-sm font-semibold whitespace-nowrap",
        look,
        className,
      )}
      {...props}
    >
      <Glyph aria-hidden className="size-3.5" />
      {children}
    </span>
  );
}
