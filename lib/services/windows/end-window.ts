import { testWindows } from "@/db/schema/windows";
import { WindowRef } from "@/lib/domain/windows/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endWindow = command({
  name: "window.end",
  needs: "site:write",
  input: WindowRef,
  async run({ tx, now }, { windowId }) {
    const siteId = await endEntry(tx, testWindows, windowId, now, "test window");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { windowId, endedAt: now } } };
  },
});
