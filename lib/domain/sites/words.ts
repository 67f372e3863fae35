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
