import { eq } from "drizzle-orm";
import { memberDetails } from "@/db/schema/people";
import { HomeInput } from "@/lib/domain/people/schemas";
import { command } from "@/lib/services/command";
import { memberToChange } from "./internal";

/** Where a day starts and ends. The audit trail says that it changed, not where somebody lives. */
export const setHome = command({
  name: "person.set-home",
  needs: "person:write",
  input: HomeInput,
  async run({ tx }, { memberId, ...home }) {
    await memberToChange(tx, memberId);
    await tx
      .update(memberDetails)
      .set({
        homeStreet: home.street,
        homeCity: home.city,
        homeState: home.state,
        homePostalCode: home.postalCode,
        homeLatitude: home.latitude,
        homeLongitude: home.longitude,
      })
      .where(eq(memberDetails.memberId, memberId));
    return { result: null, audit: { entity: "person", entityId: memberId } };
  },
});
