import type { Metadata } from "next";
import { PublicShell } from "@/components/layout/public-shell";
import { Button } from "@/components/ui/button";

export const metadata: Metadata = { title: "Sign in" };

/** Mail scanners open links; only this button spends one. */
export default async function Confirm({ searchParams }: PageProps<"/sign-in/confirm">) {
  const { token, email, callbackUrl } = await searchParams;
  return (
    <PublicShell>
      <h1 className="text-2xl font-bold">Sign in</h1>
      <p>
        As <span className="figures">{email}</span>
      </p>
      <form method="get" action="/api/auth/callback/email">
        {Object.entries({ token, email, callbackUrl }).map(
          ([name, value]) => typeof value === "string" && <input key={name} type="hidden" name={name} value={value} />,
        )}
        <Button type="submit" variant="primary" size="thumb">
          Sign in
        </Button>
      </form>
    </PublicShell>
  );
}
