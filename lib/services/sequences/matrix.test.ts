import { beforeAll, expect, test } from "vitest";
import { smallSystem, systemWithMatrix } from "@/tests/factories/systems";
import { newWorld, type World } from "@/tests/factories/world";
import { getMatrix } from "./get-matrix";
import { getScript } from "./get-script";
import { listVersions } from "./list-versions";
import { saveMatrix } from "./save-matrix";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});

test("a version is read back as it was, after others have followed", async () => {
  const { systemId, pointId, groupId, cell } = await systemWithMatrix(w);
  const own = { pointId, groupId, signal: "alarm", source: "as_found", delaySeconds: 20 };
  const { context } = w.owner;
  await saveMatrix(context, { systemId, basedOn: 1, note: "Seen at the test", removed: [cell], added: [own] });
  const [first, second] = [
    await getMatrix(context, { systemId, version: "1" }),
    await getMatrix(context, { systemId }),
  ];
  expect(first.version).toMatchObject({ number: 1, note: "From the drawings", cells: [cell] });
  expect(second).toMatchObject({ newest: 2, version: { number: 2, cells: [own] } });
  const [newest] = await listVersions(context, { systemId });
  expect(newest).toMatchObject({
    number: 2,
    note: "Seen at the test",
    changes: ["Removed: Alarm of zone 1 operates Fans", "Added: Alarm of 1-001 operates Fans (as found after 20 s)"],
  });
});

test("who changes an older version is refused, and nothing of it stays", async () => {
  const { systemId, pointId, groupId } = await systemWithMatrix(w);
  const added = [{ pointId, groupId, signal: "alarm", source: "as_found", delaySeconds: 0 }];
  const stale = saveMatrix(w.owner.context, { systemId, basedOn: 0, note: "Mine", added });
  await expect(stale).rejects.toMatchObject({ code: "conflict", message: expect.stringContaining("Version 1") });
  expect((await getMatrix(w.owner.context, { systemId })).version).toMatchObject({ number: 1 });
});

test("of two who save at once, one is told so", async () => {
  const { systemId, pointId, groupId } = await systemWithMatrix(w);
  const added = [{ pointId, groupId, signal: "alarm", source: "as_found", delaySeconds: 0 }];
  const outcomes = await Promise.allSettled(
    [w.owner, w.dispatcher].map(({ context }) => saveMatrix(context, { systemId, basedOn: 1, note: "At once", added })),
  );
  expect(outcomes.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
  expect(outcomes.find((one) => one.status === "rejected")?.reason).toMatchObject({ code: "conflict" });
});

test("a cell twice, one that is not there, and one of another system are refused", async () => {
  const { context } = w.owner;
  const { systemId, cell } = await systemWithMatrix(w);
  const elsewhere = await smallSystem(w);
  const save = (change: object) => saveMatrix(context, { systemId, basedOn: 1, note: "No", ...change });
  await expect(save({ added: [cell] })).rejects.toMatchObject({ code: "conflict" });
  await expect(save({ removed: [{ ...cell, signal: "trouble" }] })).rejects.toMatchObject({ code: "conflict" });
  await expect(save({ added: [{ ...cell, zoneId: elsewhere.zoneId }] })).rejects.toMatchObject({ code: "not_found" });
  await expect(save({ added: [{ ...cell, pointId: elsewhere.pointId }] })).rejects.toMatchObject({ code: "invalid" });
  await expect(save({})).rejects.toMatchObject({ code: "invalid" });
  await expect(save({ note: " ", removed: [cell] })).rejects.toMatchObject({ code: "invalid" });
  expect((await getMatrix(context, { systemId })).newest).toBe(1);
});

test("the script follows from the list and the newest version", async () => {
  const { systemId } = await systemWithMatrix(w);
  const script = await getScript(w.owner.context, { systemId });
  expect(script.inputs.map((step) => step.point.address)).toEqual(["1-001"]);
  expect(script.live).toMatchObject([
    {
      by: { address: "1-001" },
      operates: [{ group: { name: "Fans" }, equipment: [{ tag: "AHU-1", action: "stop" }] }],
    },
  ]);
  const bare = await getScript(w.owner.context, { systemId: (await smallSystem(w)).systemId });
  expect(bare.live).toEqual([]);
  expect(bare.notes).toContainEqual(expect.stringContaining("write down what you find"));
});
