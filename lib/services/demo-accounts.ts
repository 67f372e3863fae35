import { demoAccounts } from "@/db/demo/accounts";
import { env } from "@/lib/env";

/** For the sign-in page; empty unless this is a demo. */
export const shownDemoAccounts = () => (env().DEMO === "on" ? demoAccounts() : []);
