import type { Permission } from "@/lib/domain/shared/permissions";
import { LINK_GRANTS, OPERATOR_GRANTS, ROLE_GRANTS, WORKER_GRANTS } from "@/lib/domain/shared/permissions";
import type { Role } from "@/lib/domain/shared/roles";

/** Who asks, as a door knows it. What they are is looked up in the database at each entry. */
export type Actor =
  | { kind: "session"; sessionId: string }
  | { kind: "link"; token: string }
  | { kind: "worker"; companyId: string }
  | { kind: "operator"; companyId: string }
  | { kind: "nobody" };

/** Who has entered: the database's word, valid for one transaction. */
export type Entered =
  | {
      kind: "person";
      sessionId: string;
      companyId: string;
      userId: string;
      memberId: string;
      role: Role;
      contactId: string | null;
      customerId: string | null;
    }
  | { kind: "link"; companyId: string; linkId: string; grant: string; subjectId: string }
  | { kind: "worker"; companyId: string }
  | { kind: "operator"; companyId: string };

/** Unknown roles and grants mean no. */
export function allowed(who: Entered, permission: Permission): boolean {
  switch (who.kind) {
    case "person":
      return (ROLE_GRANTS[who.role] ?? []).includes(permission);
    case "link":
      return who.grant === permission && (LINK_GRANTS as readonly Permission[]).includes(permission);
    case "worker":
      return WORKER_GRANTS.includes(permission);
    case "operator":
      return OPERATOR_GRANTS.includes(permission);
  }
}
