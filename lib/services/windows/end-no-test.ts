import { noTestDates } from "@/db/schema/windows";
import { NoTestRef } from "@/lib/domain/windows/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endNoTest = command({
  name: "window.end-no-test",
  needs: "site:write",
  input: NoTestRef,
  async run({ tx, now }, { noTestId }) {
    const siteId = await endEntry(tx, noTestDates, noTestId, now, "no-test date");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { noTestId, endedAt: now } } };
  },
});
