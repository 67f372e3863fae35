import type { CellRow } from "@/lib/domain/sequences/matrix";
import type { CalendarDate } from "@/lib/domain/shared/zone";
import type { SiteKind } from "@/lib/domain/sites/words";
import type { Equipment, Output, OutputGroup, Point, PointZone } from "@/lib/domain/systems/device-list";

/** What the company has already, as far as an import can touch it. */
export type SiteRow = {
  id: string;
  key: string | null;
  name: string;
  kind: SiteKind;
  street: string;
  city: string;
  state: string;
  postalCode: string;
  zone: string;
  latitude: number | null;
  longitude: number | null;
  authorityName: string | null;
  authorityPhone: string | null;
};
export type SystemRow = {
  id: string;
  siteId: string;
  key: string;
  name: string;
  maker: string | null;
  model: string | null;
  location: string | null;
};
export type KnownPlaces = { sites: readonly SiteRow[]; systems: readonly SystemRow[] };

type OfSystem<R> = R & { systemId: string };
export type ZoneRow = OfSystem<PointZone>;
export type GroupRow = OfSystem<OutputGroup>;
export type PointRow = OfSystem<Point>;
export type OutputRow = OfSystem<Output>;
export type EquipmentRow = OfSystem<Equipment>;
/** A cell that holds in the newest version. */
export type CellInForce = OfSystem<CellRow & { id: string }>;

export type KnownParts = {
  zones: readonly ZoneRow[];
  groups: readonly GroupRow[];
  points: readonly PointRow[];
  outputs: readonly OutputRow[];
  equipment: readonly EquipmentRow[];
  cells: readonly CellInForce[];
  /** The newest version's number by system. */
  versions: ReadonlyMap<string, number>;
  /** What was seen to work on which date, as `provenKey` writes it. */
  proven: ReadonlySet<string>;
};

export const provenKey = (thingId: string, on: CalendarDate): string => `${thingId} ${on}`;
