import { v7 as uuidv7 } from "uuid";
import { noTestDates } from "@/db/schema/windows";
import { NoTestInput } from "@/lib/domain/windows/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addNoTest = command({
  name: "window.add-no-test",
  needs: "site:write",
  input: NoTestInput,
  async run({ tx, who }, dates) {
    await siteById(tx, dates.siteId);
    const id = uuidv7();
    await tx.insert(noTestDates).values({ ...dates, id, companyId: who.companyId });
    return { result: { noTestId: id }, audit: { entity: "site", entityId: dates.siteId, after: dates } };
  },
});
