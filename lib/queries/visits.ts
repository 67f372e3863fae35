import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import type { JobKind, WaitsFor } from "@/lib/domain/jobs/words";
import type { SlotCost } from "@/lib/domain/planning/cost";
import type { SystemFunction } from "@/lib/domain/systems/words";
import type { LiveBlockInput } from "@/lib/domain/visits/schemas";
import type { LiveBlock, SlotReason } from "@/lib/domain/visits/slot";
import type { Answer, Channel } from "@/lib/domain/visits/words";
import { getJson } from "./get-json";

/** As it comes over the wire, or as the page hands it over. */
type Instant = string | Date;
export const timeOf = (at: Instant): number => new Date(at).getTime();

export type SheetVisit = {
  id: string;
  startsAt: Instant;
  endsAt: Instant;
  startsLocal: string;
  endsLocal: string;
  sequence: number;
  canceledAt: Instant | null;
  site: { id: string; name: string; city: string };
  job: { id: string; number: number; kind: JobKind; title: string };
  crew: { memberId: string; name: string; lead: boolean }[];
  liveBlocks: {
    functions: SystemFunction[];
    startsAt: Instant;
    endsAt: Instant;
    startsLocal: string;
    endsLocal: string;
    attendees: string[];
  }[];
  asks: { name: string; answer: Answer | null }[];
};

export type TrayJob = {
  id: string;
  number: number;
  kind: JobKind;
  title: string;
  urgent: boolean;
  opens: string | null;
  ends: string | null;
  daysLeft: number | null;
  functions: SystemFunction[];
  visitMinutes: number;
  crewSize: number;
  site: { id: string; name: string; city: string };
  waitsFor: WaitsFor[];
};

export type Sheet = {
  date: string;
  today: string;
  rows: { at: Instant; clock: string }[];
  technicians: { id: string; name: string }[];
  visits: SheetVisit[];
  tray: { total: number; jobs: TrayJob[] };
};

/** A new visit of a job, or a visit that moves. */
export type Wanted = { jobId: string } | { visitId: string };

export type PlaceBand = { from: string; to: string; reasons: SlotReason[]; cost: SlotCost };

export type Places = {
  site: { name: string; zone: string };
  minutes: number;
  functions: SystemFunction[];
  crewSize: number;
  stepMinutes: number;
  starts: { at: string; local: string; liveBlocks: LiveBlock[] }[];
  windows: { startsAt: string; endsAt: string; functions: SystemFunction[] }[];
  columns: { memberId: string; name: string; bands: PlaceBand[] }[];
  standBy: { party: string; functions: SystemFunction[] }[];
  contacts: { id: string; name: string; email: string | null; phone: string | null }[];
};

export type VisitDetails = Omit<SheetVisit, "asks"> & {
  cancelReason: string | null;
  asks: {
    id: string;
    sequence: number;
    contactId: string | null;
    name: string;
    email: string | null;
    answer: Answer | null;
    answeredAt: string | null;
    channel: Channel | null;
    permitNumber: string | null;
    note: string | null;
    recordedBy: string | null;
  }[];
  overrides: { id: string; words: string; note: string; by: string }[];
  contacts: { id: string; name: string; email: string | null; phone: string | null }[];
};

const EVERY_HALF_MINUTE = 30_000;

export const sheetQuery = (date: string, initial?: Sheet) =>
  queryOptions({
    queryKey: ["run-sheet", date],
    queryFn: ({ signal }) => getJson<Sheet>(`/api/run-sheet?date=${date}`, signal),
    refetchInterval: EVERY_HALF_MINUTE,
    ...(initial && { initialData: initial }),
  });

type PlacesWish = Wanted & { date: string; helpers?: string[]; minutes?: number; stepMinutes?: number };

export const placesQuery = (wish: PlacesWish | null) =>
  queryOptions({
    queryKey: ["places", wish],
    queryFn: ({ signal }) => getJson<Places>(`/api/run-sheet/places?${search(wish ?? {})}`, signal),
    enabled: wish !== null,
    staleTime: 0,
    refetchInterval: EVERY_HALF_MINUTE,
  });

export type Placing = { startsLocal: string; minutes: number; crew: string[]; liveBlocks: LiveBlockInput[] };

export const reasonsQuery = (wanted: Wanted, placing: Placing) =>
  queryOptions({
    queryKey: ["places", "reasons", wanted, placing],
    queryFn: ({ signal }) =>
      getJson<{ reasons: SlotReason[] }>(`/api/run-sheet/reasons?${search({ ...wanted, ...placing })}`, signal),
    placeholderData: keepPreviousData,
    staleTime: 0,
    retry: false,
  });

export const visitQuery = (visitId: string) =>
  queryOptions({
    queryKey: ["visit", visitId],
    queryFn: ({ signal }) => getJson<VisitDetails>(`/api/visits/${visitId}`, signal),
    staleTime: 0,
  });

/** Everything that a booking can change. */
export const BOOKING_KEYS = [["run-sheet"], ["places"], ["visit"]] as const;

/** Lists of ids go as `a,b`, anything deeper as JSON. */
function search(values: Record<string, unknown>): string {
  const text = (value: unknown): string => {
    if (!Array.isArray(value)) return String(value);
    return value.every((one) => typeof one === "string") && value.length > 0 ? value.join(",") : JSON.stringify(value);
  };
  const entries = Object.entries(values).filter(
    ([name, value]) => value !== undefined && !(name === "helpers" && (value as unknown[]).length === 0),
  );
  return new URLSearchParams(entries.map(([name, value]) => [name, text(value)])).toString();
}
