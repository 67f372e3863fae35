import { CircleAlert, CircleCheck, Clock3, Minus } from "lucide-react";
import { cn } from "./cn";

const TONES = {
  settled: { look: "border-settled text-settled", Glyph: CircleCheck },
  alert: { look: "border-alert text-alert", Glyph: CircleAlert },
  soon: { look: "border-soon text-soon", Glyph: Clock3 },
  neutral: { look: "border-field-line text-muted", Glyph: Minus },
} as const;
export type Tone = keyof typeof TONES;

/** Never color alone: a glyph and a word go with it. */
export function Badge({ tone = "neutral", children }: { tone?: Tone; children: React.ReactNode }) {
  const { look, Glyph } = TONES[tone];
  return (
    <span
      data-slot="badge"
      className={cn("inline-flex items-center gap-1 rounded-full border px-2 py-0.5 text-sm font-semibold", look)}
    >
      <Glyph aria-hidden className="size-3.5" />
      {children}
    </span>
  );
}
