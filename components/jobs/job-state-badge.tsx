import { Badge, type Tone } from "@/components/ui/badge";
import { JOB_STATE_WORDS, type JobState } from "@/lib/domain/jobs/job-state";

const TONES: Record<JobState, Tone> = {
  to_book: "soon",
  booked: "settled",
  under_way: "settled",
  waiting: "soon",
  to_review: "soon",
  to_bill: "soon",
  billed: "settled",
  canceled: "neutral",
};

export const JobStateBadge = ({ state }: { state: JobState }) => (
  <Badge tone={TONES[state]}>{JOB_STATE_WORDS[state]}</Badge>
);
