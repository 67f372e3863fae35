import type { Metadata } from "next";
import { ForgotForm } from "@/components/account/sign-in-forms";
import { PublicShell } from "@/components/layout/public-shell";
import { askPasswordResetAction } from "../actions";

export const metadata: Metadata = { title: "Forgotten password" };

export default function Forgot() {
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">Forgotten password</h1>
      <ForgotForm action={askPasswordResetAction} />
    </PublicShell>
  );
}
