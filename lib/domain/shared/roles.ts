/** What a person is in one company. `customer` is a contact of a customer; the rest are staff. */
export const ROLES = ["owner", "dispatcher", "technician", "bookkeeper", "customer"] as const;
export type Role = (typeof ROLES)[number];

export const STAFF_ROLES = ["owner", "dispatcher", "technician", "bookkeeper"] as const satisfies readonly Role[];
export type StaffRole = (typeof STAFF_ROLES)[number];

export const ROLE_WORDS: Record<Role, string> = {
  owner: "Owner",
  dispatcher: "Dispatcher",
  technician: "Technician",
  bookkeeper: "Bookkeeper",
  customer: "Customer",
};

/** The screen on which each role lands after signing in. */
export const FIRST_SCREEN: Record<Role, string> = {
  owner: "/overview",
  dispatcher: "/run-sheet",
  technician: "/field",
  bookkeeper: "/customers",
  customer: "/portal",
};
