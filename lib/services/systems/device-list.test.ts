import { beforeAll, expect, test } from "vitest";
import { bareSystem, proof, smallSystem } from "@/tests/factories/systems";
import { newWorld, type World } from "@/tests/factories/world";
import { getOutputs } from "./get-outputs";
import { listPoints } from "./list-points";
import { putBackEntry } from "./put-back-entry";
import { removeEntry } from "./remove-entry";
import { savePoint } from "./save-point";

let w: World;
beforeAll(async () => {
  w = await newWorld();
});

const device = (systemId: string, address: string, change: object = {}) =>
  savePoint(w.owner.context, { systemId, address, kind: "smoke", label: `Device ${address}`, ...change });

const addresses = async (search: object) =>
  (await listPoints(w.owner.context, search)).rows.map(({ point }) => point.address);

test("addresses sort as people count", async () => {
  const systemId = await bareSystem(w);
  for (const address of ["L1-10", "L2-1", "L1-9"]) await device(systemId, address);
  expect(await addresses({ systemId, sort: "address" })).toEqual(["L1-9", "L1-10", "L2-1"]);
  expect(await addresses({ systemId, sort: "-address" })).toEqual(["L2-1", "L1-10", "L1-9"]);
});

test("filters by text, kind and zone narrow the list", async () => {
  const { systemId, zoneId } = await smallSystem(w);
  await device(systemId, "1-002", { kind: "pull", location: "Stair 100% north" });
  expect(await addresses({ systemId, kind: "pull" })).toEqual(["1-002"]);
  expect(await addresses({ systemId, zone: zoneId })).toEqual(["1-001"]);
  expect(await addresses({ systemId, q: "100% n" })).toEqual(["1-002"]);
  expect(await addresses({ systemId, kind: "no such kind" })).toHaveLength(2);
});

test("never proven means just that: a failure is not a proof, and a later failure does not undo one", async () => {
  const systemId = await bareSystem(w);
  const [never, failed, proven, both] = await Promise.all(
    ["1", "2", "3", "4"].map(async (address) => (await device(systemId, address)).pointId),
  );
  await proof(w, systemId, { pointId: failed }, "2026-03-01", "failed");
  await proof(w, systemId, { pointId: proven }, "2026-03-01", "proven");
  await proof(w, systemId, { pointId: both }, "2025-03-01", "proven");
  await proof(w, systemId, { pointId: both }, "2026-03-01", "failed");
  expect(await addresses({ systemId, proof: "never", sort: "address" })).toEqual(["1", "2"]);
  expect(await addresses({ systemId, proof: "failed", sort: "address" })).toEqual(["2", "4"]);
  const { proofs } = await listPoints(w.owner.context, { systemId });
  expect(proofs[never ?? ""]).toBeUndefined();
  expect(proofs[both ?? ""]).toMatchObject({ on: "2026-03-01", outcome: "failed" });
});

test("a failed pair does not say which of the two failed; a proven one proves both", async () => {
  const { systemId, pointId, groupId, equipmentId } = await smallSystem(w);
  await proof(w, systemId, { pointId, groupId }, "2026-03-01", "proven");
  await proof(w, systemId, { pointId, groupId }, "2026-09-01", "failed");
  const { proofs } = await getOutputs(w.owner.context, { systemId });
  expect(proofs.groups[groupId]).toMatchObject({ on: "2026-03-01", outcome: "proven" });
  expect(proofs.equipment[equipmentId]).toBeUndefined();
});

test("what is removed leaves the list, keeps its address and comes back as it was", async () => {
  const { systemId, pointId } = await smallSystem(w);
  const entry = { systemId, entry: "point", id: pointId };
  await removeEntry(w.owner.context, { ...entry, removedOn: "2026-12-01" });
  expect(await addresses({ systemId })).toEqual([]);
  expect(await addresses({ systemId, removed: "shown" })).toEqual(["1-001"]);
  await expect(device(systemId, "1-001")).rejects.toMatchObject({
    code: "conflict",
    fieldErrors: { address: [expect.stringContaining("already a device")] },
  });
  await putBackEntry(w.owner.context, entry);
  expect(await addresses({ systemId })).toEqual(["1-001"]);
});

test("a device of one system is not changed through another", async () => {
  const { pointId } = await smallSystem(w);
  const elsewhere = await bareSystem(w);
  await expect(device(elsewhere, "9", { id: pointId })).rejects.toMatchObject({ code: "not_found" });
  const removal = { systemId: elsewhere, entry: "point", id: pointId, removedOn: "2026-12-01" };
  await expect(removeEntry(w.owner.context, removal)).rejects.toMatchObject({ code: "not_found" });
});

test("a technician reads the list of a site that is visited, and no other", async () => {
  const { systemId } = await smallSystem(w);
  expect((await listPoints(w.technician.context, { systemId })).total).toBe(1);
  await expect(listPoints(w.otherTechnician.context, { systemId })).rejects.toMatchObject({ code: "not_found" });
});
