import { expect, test } from "vitest";
import { newCompany } from "@/tests/factories/company";
import { createSite } from "./create-site";
import { listSites } from "./list-sites";

test("a list goes by what the address says, and takes nothing else from it", async () => {
  const { owner } = await newCompany();
  const address = { street: "1 Test Street", state: "IL", postalCode: "60601", zone: "America/Chicago" };
  for (const [name, kind, city] of [
    ["Alder", "school", "Joliet"],
    ["Birch", "hotel", "Aurora"],
    ["Cedar", "school", "Aurora"],
  ])
    await createSite(owner.context, { ...address, name, kind, city });
  const names = async (search: object) => (await listSites(owner.context, search)).rows.map((site) => site.name);
  expect(await names({})).toEqual(["Alder", "Birch", "Cedar"]);
  expect(await names({ sort: "-name" })).toEqual(["Cedar", "Birch", "Alder"]);
  expect(await names({ sort: "city" })).toEqual(["Birch", "Cedar", "Alder"]);
  expect(await names({ sort: "company_id; drop table sites", page: "-3", kind: "palace" })).toHaveLength(3);
  expect(await names({ kind: "school", sort: "-name" })).toEqual(["Cedar", "Alder"]);
  expect(await names({ page: 2, pageSize: 2 })).toEqual(["Cedar"]);
});
