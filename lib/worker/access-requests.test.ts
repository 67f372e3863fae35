import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { expect, test } from "vitest";
import { database } from "@/db/client";
import { asActor } from "@/db/door";
import { accessRequests } from "@/db/schema/identity";
import { messages } from "@/db/schema/messages";
import { hire, NOW, newCompany, uniqueAddress, worker } from "@/tests/factories/company";
import { answerAccessRequests } from "./access-requests";

const ask = async (kind: "sign_in_link" | "password_reset", email: string) => {
  const id = uuidv7();
  await database()
    .insert(accessRequests)
    .values({ id, kind, email, url: kind === "sign_in_link" ? "/link" : null });
  return id;
};

const lettersTo = (companyId: string, email: string) =>
  asActor(
    worker(companyId),
    (tx) => tx.select({ template: messages.template }).from(messages).where(eq(messages.toAddress, email)),
    "read",
  );

const waiting = async (id: string) => database().select().from(accessRequests).where(eq(accessRequests.id, id));

test.each([
  ["sign_in_link", "sign-in-link"],
  ["password_reset", "password-reset"],
] as const)("%s: one letter, however many workers answer", async (kind, template) => {
  const company = await newCompany();
  const person = await hire(company, "technician");
  const id = await ask(kind, person.email.toUpperCase());
  await Promise.all([1, 2, 3].map(() => answerAccessRequests(() => NOW)));
  const letters = await lettersTo(company.companyId, person.email);
  expect(letters.filter((letter) => letter.template === template)).toHaveLength(1);
  expect(await waiting(id)).toEqual([]);
});

test("a stranger's request goes without a letter", async () => {
  const id = await ask("password_reset", uniqueAddress());
  await answerAccessRequests(() => NOW);
  expect(await waiting(id)).toEqual([]);
});
