import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { companies } from "@/db/schema/company";
import { members } from "@/db/schema/people";
import type { Entered } from "@/lib/auth/actor";
import { INVITATION_DAYS } from "@/lib/domain/shared/link-validity";
import { paths } from "@/lib/domain/shared/paths";
import { ROLE_WORDS, type Role } from "@/lib/domain/shared/roles";
import { makeLink, withdrawLinks } from "@/lib/services/links";
import { mail } from "@/lib/services/outbox";

export const daysFrom = (now: Date, days: number): Date => new Date(now.getTime() + days * 86_400_000);

type Invited = { memberId: string; name: string; email: string; role: Role };

/** A later invitation withdraws the earlier ones: only the newest letter works. */
export async function sendInvitation(tx: Tx, who: Entered, invited: Invited, now: Date): Promise<void> {
  const [company] = await tx.select({ name: companies.name }).from(companies);
  const inviter =
    who.kind === "person" ? (await tx.select().from(members).where(eq(members.id, who.memberId)))[0]?.name : undefined;
  await withdrawLinks(tx, [invited.memberId], "invitation:accept", now);
  const token = await makeLink(tx, who, {
    grant: "invitation:accept",
    subjectId: invited.memberId,
    expiresAt: daysFrom(now, INVITATION_DAYS),
  });
  const companyName = company?.name ?? "";
  await mail(
    tx,
    who,
    invited.email,
    {
      template: "invitation",
      companyName,
      invitedBy: inviter ?? companyName,
      name: invited.name,
      roleWord: ROLE_WORDS[invited.role],
    },
    paths.invitation(token),
  );
}
