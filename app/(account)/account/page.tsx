import type { Metadata } from "next";
import Link from "next/link";
import { RowAction } from "@/components/form/row-action";
import { PublicShell } from "@/components/layout/public-shell";
import { ThemeChoice } from "@/components/layout/theme-choice";
import { FIRST_SCREEN, ROLE_WORDS } from "@/lib/domain/shared/roles";
import { getFrame } from "@/lib/services/company/get-frame";
import { read } from "@/lib/web/page";
import { signOutEverywhereAction } from "./actions";

export const metadata: Metadata = { title: "Your account" };

export default async function AccountPage() {
  const { personName, role, company } = await read(getFrame);
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">{personName}</h1>
      <p>
        {ROLE_WORDS[role]}, {company.name}
      </p>
      <ThemeChoice />
      <RowAction action={signOutEverywhereAction} name="all" value="on" button="Sign out everywhere" danger />
      <Link href={FIRST_SCREEN[role]} className="underline">
        Back
      </Link>
    </PublicShell>
  );
}
