import { AskInput } from "@/lib/domain/visits/schemas";
import { command } from "@/lib/services/command";
import { askContacts } from "./asks";

export const askForVisit = command({
  name: "visit.ask",
  needs: "visit:write",
  input: AskInput,
  async run({ tx, who, now }, { visitId, contactIds }) {
    const asked = await askContacts(tx, who, visitId, contactIds, now);
    return { result: { asked }, audit: { entity: "visit", entityId: visitId, after: { asked } } };
  },
});
