import { expect, test } from "vitest";
import { AppError } from "@/lib/errors";
import { givePassword, hire, NOW, newCompany, type Person, secondSession } from "@/tests/factories/company";
import { changePassword } from "./change-password";
import { endSession } from "./end-session";
import { enterCompany } from "./enter-company";
import { getAccount } from "./get-account";
import { inviteStaff } from "./invite-staff";

const OLD = "correct horse battery";
const NEW = "another quiet evening";

const codeOf = (promise: Promise<unknown>) =>
  promise.then(
    () => "done",
    (error) => (error instanceof AppError ? error.code : String(error)),
  );

const elsewhere = async ({ actor }: Person) => ({
  actor: { kind: "session" as const, sessionId: await secondSession(actor) },
  now: NOW,
});

test("a new password asks for the old one, and signs out everywhere", async () => {
  const technician = await hire(await newCompany(), "technician");
  await givePassword(technician.actor, OLD);
  const phone = await elsewhere(technician);
  const wrong = changePassword(technician.context, { currentPassword: NEW, password: NEW });
  await expect(wrong).rejects.toMatchObject({ code: "invalid", fieldErrors: { currentPassword: expect.anything() } });
  expect(await codeOf(getAccount(phone, {}))).toBe("done");
  await changePassword(technician.context, { currentPassword: OLD, password: NEW });
  expect(await codeOf(getAccount(phone, {}))).toBe("unauthenticated");
  expect(await codeOf(getAccount(technician.context, {}))).toBe("unauthenticated");
});

test("one browser is signed out, the other stays, and nobody signs out somebody else", async () => {
  const company = await newCompany();
  const technician = await hire(company, "technician");
  const phone = await elsewhere(technician);
  const { sessions } = await getAccount(technician.context, {});
  expect(sessions.map(({ here }) => here).sort()).toEqual([false, true]);
  const other = sessions.find(({ here }) => !here);
  expect(await codeOf(endSession(company.owner.context, { sessionId: other?.id }))).toBe("not_found");
  await endSession(technician.context, { sessionId: other?.id });
  expect(await codeOf(getAccount(phone, {}))).toBe("unauthenticated");
  expect(await codeOf(getAccount(technician.context, {}))).toBe("done");
});

test("a person of two companies goes from one to the other, and nowhere else", async () => {
  const [here, there, strange] = [await newCompany(), await newCompany(), await newCompany()];
  const person = await hire(here, "technician");
  await inviteStaff(there.owner.context, { name: "The same", email: person.email, role: "dispatcher" });
  expect((await getAccount(person.context, {})).memberships.map(({ companyId }) => companyId)).toEqual([
    here.companyId,
    there.companyId,
  ]);
  expect(await codeOf(enterCompany(person.context, { companyId: strange.companyId }))).toBe("not_found");
  await enterCompany(person.context, { companyId: there.companyId });
  expect(await getAccount(person.context, {})).toMatchObject({ companyId: there.companyId, role: "dispatcher" });
});
