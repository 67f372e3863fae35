import { afterAll, expect, test } from "vitest";
import { hire, newCompany } from "../factories/company";
import { deliveriesTo, timePasses } from "../factories/outbox";
import { mailServer } from "../factories/smtp";
import { start } from "./program";

const mail = await mailServer();
afterAll(() => mail.close());

const worker = () => start("lib/worker/main.ts", { SMTP_URL: mail.url });

async function until(condition: () => Promise<boolean>) {
  while (!(await condition())) await new Promise((resolve) => setImmediate(resolve));
}

test("a worker killed in the middle of a job loses nothing and doubles nothing", async () => {
  const company = await newCompany();
  const { email } = await hire(company, "technician");
  const delivery = async () => (await deliveriesTo(company.companyId, email))[0];

  const inTheMiddle = mail.hold(email);
  const first = worker();
  await inTheMiddle;
  await first.end("SIGKILL");
  expect(await delivery()).toMatchObject({ doneAt: null, sentAt: null, leasedUntil: expect.any(Date) });

  mail.letGo(email);
  await timePasses(company.companyId);
  const second = worker();
  await until(async () => Boolean((await delivery())?.doneAt));
  expect(mail.to(email)).toEqual([expect.objectContaining({ messageId: (await delivery())?.messageId })]);
  await second.end("SIGTERM");
});
