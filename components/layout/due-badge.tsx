import { Badge, type Tone } from "@/components/ui/badge";
import type { DueState } from "@/lib/domain/agreements/due-window";
import { DUE_STATE_WORDS } from "@/lib/domain/agreements/due-words";

const TONES: Record<DueState, Tone> = { overdue: "alert", due: "soon", soon: "neutral", early: "neutral" };

export const DueBadge = ({ state }: { state: DueState }) => <Badge tone={TONES[state]}>{DUE_STATE_WORDS[state]}</Badge>;
