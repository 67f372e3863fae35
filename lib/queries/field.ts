import { queryOptions } from "@tanstack/react-query";
import type { JobKind } from "@/lib/domain/jobs/words";
import { getJson } from "./get-json";

export type FieldVisit = {
  id: string;
  startsLocal: string;
  endsLocal: string;
  canceledAt: string | null;
  site: { name: string; street: string; city: string };
  job: { number: number; kind: JobKind; title: string };
  crew: { memberId: string; name: string; lead: boolean }[];
  accessNote: string | null;
  /** Codes that this day's crew may look at. */
  secrets: { id: string; label: string }[];
  contacts: { name: string; title: string | null; phone: string | null }[];
};

type FieldDay = { company: { name: string; phone: string }; today: string; visits: FieldVisit[] };

export const fieldDayQuery = queryOptions({
  queryKey: ["field", "day"],
  queryFn: ({ signal }) => getJson<FieldDay>("/api/field/day", signal),
});
