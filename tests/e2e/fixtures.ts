import { randomInt } from "node:crypto";
import { test as base } from "@playwright/test";

export { expect } from "@playwright/test";

/** Each test calls from a network address of its own, as its proxy would report it: limits count by address. */
export const test = base.extend({
  extraHTTPHeaders: async ({ baseURL: _ }, use) => {
    await use({ "x-forwarded-for": `198.51.100.${randomInt(1, 255)}, 203.0.113.${randomInt(1, 255)}` });
  },
});
