import type { Metadata } from "next";
import Link from "next/link";
import { LinkForm, PasswordForm } from "@/components/account/sign-in-forms";
import { PublicShell } from "@/components/layout/public-shell";
import { Callout } from "@/components/ui/card";
import { shownDemoAccounts } from "@/lib/services/demo-accounts";
import { linkSignInAction, passwordSignInAction } from "../actions";

export const metadata: Metadata = { title: "Sign in" };

const SAID: Record<string, string> = {
  invitation: "You are in. Sign in with your password.",
  reset: "Your password is changed. Sign in with the new one.",
};

export default async function SignIn({ searchParams }: PageProps<"/sign-in">) {
  const { next, from, error } = await searchParams;
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">Sign in</h1>
      {typeof from === "string" && SAID[from] && <Callout>{SAID[from]}</Callout>}
      {error && <Callout tone="alert">That link no longer works. Ask for a new one below.</Callout>}
      <PasswordForm
        action={passwordSignInAction}
        next={typeof next === "string" ? next : "/"}
        demo={shownDemoAccounts()}
      />
      <p>
        <Link href="/forgot" className="underline">
          I forgot my password
        </Link>
      </p>
      <LinkForm action={linkSignInAction} next={typeof next === "string" ? next : "/"} />
    </PublicShell>
  );
}
