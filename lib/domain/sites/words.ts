export const SITE_KINDS = [
  "hospital",
  "school",
  "office",
  "hotel",
  "theater",
  "library",
  "cold_store",
  "cannery",
  "warehouse",
  "apartments",
  "laboratory",
  "worship",
  "court",
  "retail",
  "other",
] as const;
export type SiteKind = (typeof SITE_KINDS)[number];

export const SITE_KIND_WORDS: Record<SiteKind, string> = {
  hospital: "Hospital",
  school: "School",
  office: "Office tower",
  hotel: "Hotel",
  theater: "Theater",
  library: "Library",
  cold_store: "Cold store",
  cannery: "Cannery",
  warehouse: "Warehouse",
  apartments: "Apartments",
  laboratory: "Laboratory",
  worship: "House of worship",
  court: "Courthouse",
  retail: "Shops",
  other: "Other",
};

/** What a customer is to a site. */
export const HOLDER_CAPACITIES = ["owner", "manager", "bill_to", "occupant"] as const;
export type HolderCapacity = (typeof HOLDER_CAPACITIES)[number];

export const HOLDER_CAPACITY_WORDS: Record<HolderCapacity, string> = {
  owner: "Owner",
  manager: "Manager",
  bill_to: "Bill to",
  occupant: "Occupant",
};

/** Codes that open doors or accounts: kept apart, encrypted. */
export const SECRET_KINDS = ["station_passcode", "panel_code", "key_box_code", "door_code"] as const;
export type SecretKind = (typeof SECRET_KINDS)[number];

export const SECRET_KIND_WORDS: Record<SecretKind, string> = {
  station_passcode: "Supervising-station passcode",
  panel_code: "Panel code",
  key_box_code: "Key-box code",
  door_code: "Door code",
};

export const KEY_KINDS = ["key", "badge", "fob"] as const;
export type KeyKind = (typeof KEY_KINDS)[number];

export const KEY_KIND_WORDS: Record<KeyKind, string> = { key: "Key", badge: "Badge", fob: "Fob" };

export const DOCUMENT_KINDS = ["sequence", "drawing", "program", "record", "permit", "other"] as const;
export type DocumentKind = (typeof DOCUMENT_KINDS)[number];

export const DOCUMENT_KIND_WORDS: Record<DocumentKind, string> = {
  sequence: "Sequence of operation",
  drawing: "Drawing",
  program: "Panel program",
  record: "Earlier record",
  permit: "Permit",
  other: "Other paper",
};
