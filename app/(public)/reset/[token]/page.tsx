import type { Metadata } from "next";
import { NewPasswordForm } from "@/components/account/sign-in-forms";
import { PublicShell } from "@/components/layout/public-shell";
import { resetPasswordAction } from "../../actions";

export const metadata: Metadata = { title: "New password", referrer: "no-referrer" };

export default async function Reset({ params }: PageProps<"/reset/[token]">) {
  const { token } = await params;
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">New password</h1>
      <p>Saving it signs you out everywhere.</p>
      <NewPasswordForm action={resetPasswordAction} token={token} button="Save the new password" />
    </PublicShell>
  );
}
