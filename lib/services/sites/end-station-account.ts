import { stationAccounts } from "@/db/schema/sites";
import { StationAccountRef } from "@/lib/domain/sites/schemas";
import { command } from "@/lib/services/command";
import { endEntry } from "@/lib/services/sites/internal";

export const endStationAccount = command({
  name: "site.end-station-account",
  needs: "site:write",
  input: StationAccountRef,
  async run({ tx, now }, { stationAccountId }) {
    const siteId = await endEntry(tx, stationAccounts, stationAccountId, now, "station account");
    return { result: null, audit: { entity: "site", entityId: siteId, after: { stationAccountId, endedAt: now } } };
  },
});
