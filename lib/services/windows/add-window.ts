import { v7 as uuidv7 } from "uuid";
import { testWindows } from "@/db/schema/windows";
import { WindowInput } from "@/lib/domain/windows/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addWindow = command({
  name: "window.add",
  needs: "site:write",
  input: WindowInput,
  async run({ tx, who }, window) {
    await siteById(tx, window.siteId);
    const id = uuidv7();
    await tx.insert(testWindows).values({ ...window, id, companyId: who.companyId });
    return { result: { windowId: id }, audit: { entity: "site", entityId: window.siteId, after: window } };
  },
});
