import "server-only";
import { DrizzleAdapter } from "@auth/drizzle-adapter";
import { headers } from "next/headers";
import NextAuth, { CredentialsSignin } from "next-auth";
import type { EmailConfig } from "next-auth/providers";
import Credentials from "next-auth/providers/credentials";
import { database } from "@/db/client";
import { accounts, users, verificationTokens } from "@/db/schema/identity";
import { SIGN_IN_LINK_MINUTES } from "@/lib/domain/shared/link-validity";
import { env } from "@/lib/env";
import { log } from "@/lib/log";
import { requestAccess } from "./access-requests";
import { passwordMatches } from "./password";
import { endSession, membershipsOf, SESSION_DAYS, startSession, storedPassword } from "./sessions";

declare module "next-auth" {
  interface Session {
    sid?: string;
  }
}

/** A page of ours stands between the letter and Auth.js: opening an address never spends it, pressing a button does. */
function confirmAddress(callback: string): string {
  const from = new URL(callback);
  const to = new URL("/sign-in/confirm", env().APP_URL);
  for (const name of ["token", "email", "callbackUrl"]) to.searchParams.set(name, from.searchParams.get(name) ?? "");
  return to.toString();
}

const emailLink: EmailConfig = {
  id: "email",
  type: "email",
  name: "E-mail",
  from: "",
  maxAge: SIGN_IN_LINK_MINUTES * 60,
  options: {},
  /** Written alike for every address; the worker finds out whether anybody is there. */
  async sendVerificationRequest({ identifier, url }) {
    await requestAccess({ kind: "sign_in_link", email: identifier, url: confirmAddress(url) });
  },
};

const password = Credentials({
  id: "password",
  credentials: { email: {}, password: {} },
  async authorize({ email, password: typed }) {
    const stored = await storedPassword(String(email));
    const matches = await passwordMatches(stored?.hash, String(typed));
    return matches && stored ? { id: stored.userId } : null;
  },
});

export const { handlers, auth, signIn, signOut } = NextAuth(() => ({
  secret: env().AUTH_SECRET,
  trustHost: true,
  logger: {
    // A wrong password is an answer, not an error.
    error: (error) => (error instanceof CredentialsSignin ? undefined : log().error({ err: error }, "sign-in failed")),
  },
  adapter: DrizzleAdapter(database(), {
    usersTable: users,
    accountsTable: accounts,
    verificationTokensTable: verificationTokens,
  }),
  session: { strategy: "jwt", maxAge: SESSION_DAYS * 86_400 },
  pages: { signIn: "/sign-in", error: "/sign-in", verifyRequest: "/sign-in/sent" },
  providers: [password, emailLink],
  callbacks: {
    /** Asking for a link is answered alike for everybody; coming in needs a place in some company. */
    async signIn({ user, email }) {
      if (email?.verificationRequest) return true;
      return Boolean(user.id) && (await membershipsOf(user.id ?? "").catch(() => [])).length > 0;
    },
    async jwt({ token, user }) {
      if (!user?.id) return token;
      const sid = await startSession(user.id, new Date(), (await headers()).get("user-agent"));
      return sid ? { sid } : null;
    },
    session({ session, token }) {
      return { expires: session.expires, sid: typeof token.sid === "string" ? token.sid : undefined };
    },
  },
  events: {
    async signOut(message) {
      if ("token" in message && typeof message.token?.sid === "string") await endSession(message.token.sid, new Date());
    },
  },
}));
