import { v7 as uuidv7 } from "uuid";
import { stationAccounts } from "@/db/schema/sites";
import { StationAccountInput } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { siteById } from "@/lib/services/sites/internal";

export const addStationAccount = command({
  name: "site.add-station-account",
  needs: "site:write",
  input: StationAccountInput,
  async run({ tx, who }, account) {
    await siteById(tx, account.siteId);
    const id = uuidv7();
    await tx.insert(stationAccounts).values({ ...account, id, companyId: who.companyId });
    return { result: { stationAccountId: id }, audit: { entity: "site", entityId: account.siteId, after: account } };
  },
});
