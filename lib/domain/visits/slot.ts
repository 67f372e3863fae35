import type { SystemFunction } from "@/lib/domain/systems/words";
import type { NoTestDate, TestWindow } from "@/lib/domain/windows/spans";
import type { CalendarDate, LocalTime, Zone } from "../shared/zone";
import type { SlotReasonCode } from "./words";

/** A part of a visit in which functions really operate, counted from the visit's start. */
export type LiveBlock = { offsetMinutes: number; minutes: number; functions: readonly SystemFunction[] };

/** Who of the crew must hold a license valid in the site's state; `kind` null takes any. */
export type LicenseDemand = { of: "lead" | "each"; kind: string | null };

export const LEAD_IS_LICENSED: readonly LicenseDemand[] = [{ of: "lead", kind: null }];

export type WantedVisit = {
  minutes: number;
  /** Those that no live block names count as operating through the whole visit. */
  functions: readonly SystemFunction[];
  liveBlocks: readonly LiveBlock[];
  crewSize: number;
  licenses: readonly LicenseDemand[];
  /** Both included, in the site's zone. */
  due: { earliest: CalendarDate | null; latest: CalendarDate | null };
};

export type Place = {
  crew: readonly { memberId: string; lead: boolean }[];
  startsLocal: LocalTime;
  zone: Zone;
};

export type Span = { startsAt: Date; endsAt: Date };

export type SlotFacts = {
  now: Date;
  /** Names of people, for the words. */
  names: Readonly<Record<string, string>>;
  /** Where the crew is already: other visits, by person. */
  busy: readonly (Span & { memberId: string; where: string })[];
  licenses: readonly { memberId: string; kind: string; jurisdiction: string; expiresOn: CalendarDate }[];
  siteState: string;
  windows: readonly TestWindow[];
  noTestDates: readonly NoTestDate[];
};

/** Why a visit should not, or cannot, be at a place and time. */
export type SlotReason = { code: SlotReasonCode; words: string; overridable: boolean };

const MINUTE_MS = 60_000;

export const spanFrom = (startsAt: Date, minutes: number): Span => ({
  startsAt,
  endsAt: new Date(startsAt.getTime() + minutes * MINUTE_MS),
});

export const within = (inner: Span, outer: Span): boolean =>
  inner.startsAt >= outer.startsAt && inner.endsAt <= outer.endsAt;
