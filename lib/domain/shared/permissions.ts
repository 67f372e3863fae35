import type { Role } from "./roles";

/** Everything that anybody may be allowed to do. A verb or read names exactly one. */
export const PERMISSIONS = [
  "account:own",
  "agreement:read",
  "agreement:write",
  "audit:read",
  "company:found",
  "company:read",
  "company:write",
  "customer:read",
  "customer:write",
  "delivery:read",
  "delivery:retry",
  "due:sweep",
  "field:read",
  "find:read",
  "invitation:accept",
  "job:read",
  "job:write",
  "mail:send",
  "password:reset",
  "person:read",
  "person:write",
  "portal:read",
  "secret:look",
  "secret:write",
  "site:read",
  "site:write",
  "system:read",
  "system:write",
  "visit:answer",
  "visit:override",
  "visit:read",
  "visit:write",
] as const;
export type Permission = (typeof PERMISSIONS)[number];

const OFFICE = [
  "account:own",
  "agreement:read",
  "company:read",
  "customer:read",
  "find:read",
  "job:read",
  "person:read",
  "site:read",
  "system:read",
  "visit:read",
] as const satisfies readonly Permission[];

/** The one table of who may do what; row-level security decides on which rows. */
export const ROLE_GRANTS: Record<Role, readonly Permission[]> = {
  owner: [
    ...OFFICE,
    "agreement:write",
    "audit:read",
    "company:write",
    "customer:write",
    "delivery:read",
    "delivery:retry",
    "job:write",
    "person:write",
    "secret:look",
    "secret:write",
    "site:write",
    "system:write",
    "visit:override",
    "visit:write",
  ],
  dispatcher: [
    ...OFFICE,
    "agreement:write",
    "customer:write",
    "job:write",
    "secret:look",
    "secret:write",
    "site:write",
    "system:write",
    "visit:override",
    "visit:write",
  ],
  bookkeeper: [...OFFICE, "agreement:write", "customer:write"],
  technician: ["account:own", "field:read", "find:read", "secret:look", "system:read"],
  customer: ["account:own", "find:read", "portal:read", "visit:answer"],
};

/** What a signed link may carry. */
export const LINK_GRANTS = [
  "invitation:accept",
  "password:reset",
  "visit:answer",
] as const satisfies readonly Permission[];
export type LinkGrant = (typeof LINK_GRANTS)[number];

export const WORKER_GRANTS: readonly Permission[] = ["due:sweep", "mail:send"];
export const OPERATOR_GRANTS: readonly Permission[] = ["company:found"];

/** Whether a screen shows the way to something; the verb decides for itself. */
export const mayDo = (role: Role, permission: Permission): boolean => ROLE_GRANTS[role].includes(permission);
