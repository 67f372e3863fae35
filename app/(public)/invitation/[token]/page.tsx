import type { Metadata } from "next";
import { NewPasswordForm } from "@/components/account/sign-in-forms";
import { PublicShell } from "@/components/layout/public-shell";
import { acceptInvitationAction } from "../../actions";

export const metadata: Metadata = { title: "Invitation", referrer: "no-referrer" };

export default async function Invitation({ params }: PageProps<"/invitation/[token]">) {
  const { token } = await params;
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">You are invited</h1>
      <p>Choose a password. If you already sign in here, type the one you have: it stays as it is.</p>
      <NewPasswordForm action={acceptInvitationAction} token={token} button="Accept" />
    </PublicShell>
  );
}
