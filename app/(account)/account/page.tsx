import type { Metadata } from "next";
import { ChangePasswordForm } from "@/components/account/change-password-form";
import { Sessions } from "@/components/account/sessions";
import { RowAction } from "@/components/form/row-action";
import { Section } from "@/components/layout/page-header";
import { PublicShell } from "@/components/layout/public-shell";
import { ThemeChoice } from "@/components/layout/theme-choice";
import { TextLink } from "@/components/ui/text-link";
import { FIRST_SCREEN, ROLE_WORDS } from "@/lib/domain/shared/roles";
import { getAccount } from "@/lib/services/people/get-account";
import { read } from "@/lib/web/page";
import { changePasswordAction, endSessionAction, enterCompanyAction, signOutEverywhereAction } from "./actions";

export const metadata: Metadata = { title: "Your account" };

export default async function AccountPage() {
  const { name, email, role, companyId, memberships, sessions } = await read(getAccount);
  return (
    <PublicShell>
      <header>
        <h1 className="text-2xl font-bold">{name}</h1>
        <p className="figures text-muted">{email}</p>
      </header>
      <Section title="Company">
        <ul className="grid gap-2">
          {memberships.map((membership) => (
            <li key={membership.companyId} className="flex flex-wrap items-center justify-between gap-2">
              <span>
                {membership.companyName}, {ROLE_WORDS[membership.role].toLowerCase()}
              </span>
              {membership.companyId !== companyId && (
                <RowAction
                  action={enterCompanyAction}
                  name="companyId"
                  value={membership.companyId}
                  button="Go there"
                />
              )}
            </li>
          ))}
        </ul>
      </Section>
      <ThemeChoice />
      <Section title="Signed in">
        <Sessions sessions={sessions} end={endSessionAction} />
        <RowAction action={signOutEverywhereAction} name="all" value="on" button="Sign out everywhere" danger />
      </Section>
      <Section title="Password">
        <ChangePasswordForm action={changePasswordAction} />
      </Section>
      <TextLink href={FIRST_SCREEN[role]}>Back to work</TextLink>
    </PublicShell>
  );
}
