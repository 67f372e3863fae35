import { eq } from "drizzle-orm";
import { beforeAll, expect, test } from "vitest";
import { asActor } from "@/db/door";
import { auditEntries } from "@/db/schema/audit";
import { siteSecrets } from "@/db/schema/sites";
import { find } from "@/lib/services/find/find";
import { getFieldDay } from "@/lib/services/visits/get-field-day";
import { hire } from "@/tests/factories/company";
import { rowsSeen } from "@/tests/factories/sight";
import { CODE, newSecret } from "@/tests/factories/systems";
import { visitInHours } from "@/tests/factories/today";
import { newWorld, type World } from "@/tests/factories/world";
import { endSecret } from "./end-secret";
import { getSiteFacts } from "./get-site-facts";
import { lookAtSecret } from "./look-at-secret";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});

/** A technician who comes to a site so many hours from now, and a code there. */
async function visited(hours: number) {
  const technician = await hire(w.company, "technician");
  const { siteId } = await visitInHours(w, technician, hours);
  return { technician, siteId, secretId: await newSecret(w, siteId) };
}

const rowOf = (secretId: string) =>
  asActor(
    w.owner.actor,
    async (tx) => (await tx.select().from(siteSecrets).where(eq(siteSecrets.id, secretId)))[0],
    "read",
  );

test("that day's crew sees the code, and each look is in the audit trail without it", async () => {
  const { technician, siteId, secretId } = await visited(1);
  expect(await lookAtSecret(technician.context, { secretId })).toEqual({ code: CODE });
  await lookAtSecret(w.dispatcher.context, { secretId });
  const trail = await asActor(
    w.owner.actor,
    (tx) => tx.select().from(auditEntries).where(eq(auditEntries.entityId, siteId)),
    "read",
  );
  const looks = trail.filter(({ command }) => command === "secret.look");
  expect(looks.map(({ memberId }) => memberId)).toEqual([technician.memberId, w.dispatcher.memberId]);
  expect(looks[0]?.after).toMatchObject({ secretId });
  expect(JSON.stringify(trail)).not.toContain(CODE);
});

test("another technician, and the crew of another day, are refused, and see no such row", async () => {
  const { secretId } = await visited(1);
  for (const { technician } of [await visited(1), await visited(40), await visited(-40)]) {
    await expect(lookAtSecret(technician.context, { secretId })).rejects.toMatchObject({ code: "not_found" });
  }
  for (const hours of [40, -40]) {
    const own = await visited(hours);
    await expect(lookAtSecret(own.technician.context, { secretId: own.secretId })).rejects.toMatchObject({
      code: "not_found",
    });
    expect(await rowsSeen(own.technician.actor, "site_secrets")).toEqual([]);
  }
});

test("the day of a technician names the codes of this day's site alone, and none of them openly", async () => {
  const { technician, siteId, secretId } = await visited(1);
  await visitInHours(w, technician, 60);
  const { visits } = await getFieldDay({ ...technician.context, now: new Date() }, {});
  expect(visits.flatMap(({ secrets }) => secrets.map(({ id }) => id))).toEqual([secretId]);
  expect(visits.find(({ secrets }) => secrets.length > 0)?.site.id).toBe(siteId);
  expect(JSON.stringify(visits)).not.toMatch(/sealed|7-3-5-1/);
});

test("neither the database's row nor anything read of the site holds the code", async () => {
  const { siteId, secretId } = await visited(1);
  const row = await rowOf(secretId);
  expect(Buffer.from(row?.sealed ?? "", "base64").toString("latin1")).not.toContain(CODE);
  expect(row?.sealed).not.toContain(Buffer.from(CODE).toString("base64").slice(0, 6));
  const told = JSON.stringify([
    await getSiteFacts(w.owner.context, { siteId }),
    await find(w.owner.context, { q: CODE }),
    await find(w.owner.context, { q: row?.label }),
  ]);
  expect(told).not.toContain(CODE);
  expect(told).not.toContain(row?.sealed ?? "sealed");
});

test("a row whose cipher text was exchanged does not open, and nobody's look is recorded", async () => {
  const [first, second] = [await newSecret(w), await newSecret(w)];
  const other = await rowOf(second);
  await asActor(
    w.owner.actor,
    (tx) =>
      tx
        .update(siteSecrets)
        .set({ sealed: other?.sealed ?? "" })
        .where(eq(siteSecrets.id, first)),
    "write",
  );
  await expect(lookAtSecret(w.owner.context, { secretId: first })).rejects.toMatchObject({ code: "blocked" });
  expect(await lookAtSecret(w.owner.context, { secretId: second })).toEqual({ code: CODE });
});

test("an ended code is gone for good", async () => {
  const secretId = await newSecret(w);
  await endSecret(w.owner.context, { secretId });
  await expect(lookAtSecret(w.owner.context, { secretId })).rejects.toMatchObject({ code: "not_found" });
  expect((await rowOf(secretId))?.sealed).toBe("");
});
