import { sql } from "drizzle-orm";
import { afterAll, expect, test, vi } from "vitest";
import { database } from "@/db/client";
import { MOST_ATTEMPTS } from "@/lib/domain/messages/backoff";
import { AppError } from "@/lib/errors";
import { listDeadLetters } from "@/lib/services/messages/list-dead-letters";
import { retryDeadLetter } from "@/lib/services/messages/retry-dead-letter";
import { runOutbox } from "@/lib/worker/outbox-runner";
import { type Company, hire, newCompany } from "../factories/company";
import { deliveriesTo, timePasses } from "../factories/outbox";
import { mailServer } from "../factories/smtp";

const mail = await mailServer();
vi.stubEnv("SMTP_URL", mail.url);
afterAll(() => mail.close());

const run = () =>
  runOutbox(
    () => new Date(),
    () => true,
  );

/** Hiring somebody writes one letter, to an address of its own. */
async function withLetter(company: Company) {
  const { email } = await hire(company, "technician");
  const [delivery] = await deliveriesTo(company.companyId, email);
  if (!delivery) throw new Error("hiring wrote no letter");
  return { email, messageId: delivery.messageId };
}

test("a letter goes out once, under the Message-ID that was written with it", async () => {
  const company = await newCompany();
  const { email, messageId } = await withLetter(company);
  await run();
  await timePasses(company.companyId);
  await run();
  expect(mail.to(email)).toEqual([expect.objectContaining({ messageId })]);
  expect(mail.to(email)[0]?.text).toContain("http://localhost:3000/invitation/");
  const [delivery] = await deliveriesTo(company.companyId, email);
  expect(delivery).toMatchObject({ doneAt: expect.any(Date), sentAt: expect.any(Date), lastError: null });
});

test("three workers at once send each letter once", async () => {
  const company = await newCompany();
  const letters = [];
  for (let i = 0; i < 25; i++) letters.push(await withLetter(company));
  await Promise.all([run(), run(), run()]);
  for (const { email } of letters) expect(mail.to(email)).toHaveLength(1);
});

test("a refusal is tried again later and later, then given up; the owner sees it and sends it on its way again", async () => {
  const company = await newCompany();
  const dispatcher = await hire(company, "dispatcher");
  const { email } = await withLetter(company);
  mail.refuse(email, 450);
  const waits: number[] = [];
  for (let attempt = 1; attempt <= MOST_ATTEMPTS; attempt++) {
    await timePasses(company.companyId);
    await run();
    const [delivery] = await deliveriesTo(company.companyId, email);
    expect(delivery).toMatchObject({
      attempts: attempt,
      doneAt: null,
      sentAt: null,
      lastError: expect.stringContaining("450"),
    });
    waits.push(Math.round(delivery?.waitSeconds ?? 0));
  }
  for (const [i, wait] of waits.slice(1, -1).entries()) expect(wait).toBeGreaterThan(waits[i] ?? 0);
  await timePasses(company.companyId);
  await run();
  const [dead] = await deliveriesTo(company.companyId, email);
  expect(dead).toMatchObject({ attempts: MOST_ATTEMPTS, deadAt: expect.any(Date) });

  const { rows } = await listDeadLetters(company.owner.context, {});
  expect(rows.map((row) => row.id)).toEqual([dead?.id]);
  await expect(listDeadLetters(dispatcher.context, {})).rejects.toThrow(AppError);
  mail.accept(email);
  await retryDeadLetter({ ...company.owner.context, now: new Date() }, { outboxId: dead?.id });
  await run();
  expect(mail.to(email)).toHaveLength(1);
  expect((await listDeadLetters(company.owner.context, {})).rows).toEqual([]);
});

test("what a worker has taken nobody else takes, until its lease is over", async () => {
  const company = await newCompany();
  const { email } = await withLetter(company);
  // A worker takes everything that is due, and dies.
  await database().execute(sql`select * from app.claim_outbox(10000, interval '2 minutes')`);
  await run();
  expect(mail.to(email)).toEqual([]);
  await timePasses(company.companyId);
  await run();
  expect(mail.to(email)).toHaveLength(1);
});

test("an address that lets somebody in is nowhere once the letter is out, nor in what is said of a failure", async () => {
  const company = await newCompany();
  const { email } = await withLetter(company);
  mail.refuse(email, 550);
  await run();
  const [failed] = await deliveriesTo(company.companyId, email);
  expect(failed?.lastError).not.toContain("/invitation/");
  mail.accept(email);
  await timePasses(company.companyId);
  await run();
  const { rows } = await listDeadLetters(company.owner.context, {});
  expect(rows).toEqual([]);
  expect(mail.to(email)).toHaveLength(1);
});
