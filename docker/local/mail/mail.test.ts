import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createTransport } from "nodemailer";
import { afterAll, beforeAll, expect, test } from "vitest";

type Message = { id: string; to: string[]; subject: string; messageId: string; text: string; links: string[] };

const folder = mkdtempSync(join(tmpdir(), "coastdown-mail-"));
let server: ChildProcess;
let smtp: string;
let http: string;

async function startServer() {
  const main = join(import.meta.dirname, "main.mjs");
  server = spawn(process.execPath, [main, "--smtp", "0", "--http", "0", "--dir", folder]);
  const [line] = (await once(server.stdout as NodeJS.ReadableStream, "data")) as [Buffer];
  [smtp, http] = line.toString().trim().split(" ") as [string, string];
}

async function stopServer() {
  server.kill("SIGKILL");
  await once(server, "exit");
}

const send = (to: string, more: object = {}) =>
  createTransport(smtp).sendMail({ from: "office@coastdown.example", to, subject: "Hello", text: "Text", ...more });
const listed = async (query: string) => (await (await fetch(`${http}/api/messages${query}`)).json()) as Message[];
const order = (fault: object) => fetch(`${http}/api/faults`, { method: "POST", body: JSON.stringify(fault) });

beforeAll(startServer);
afterAll(async () => {
  await stopServer();
  rmSync(folder, { recursive: true });
});

test("a message arrives whole: envelope, parts, links and attachment", async () => {
  await send("whole@customer.example", {
    subject: "Prüfung am Freitag",
    html: '<p><a href="https://coastdown.example/l/1?a=1&amp;b=2">Acknowledge</a></p>',
    attachments: [{ filename: "visit.ics", content: "BEGIN:VCALENDAR", contentType: "text/calendar" }],
  });
  const [message] = await listed("?to=Whole@Customer.example");
  expect(message).toMatchObject({
    to: ["whole@customer.example"],
    subject: "Prüfung am Freitag",
    text: "Text",
    links: ["https://coastdown.example/l/1?a=1&b=2"],
    attachments: [{ name: "visit.ics", type: "text/calendar", size: 15 }],
  });
  const file = await fetch(`${http}/messages/${message?.id}/attachments/0`);
  expect(await file.text()).toBe("BEGIN:VCALENDAR");
  expect(await (await fetch(`${http}/messages/${message?.id}/raw`)).text()).toContain("Subject: =?UTF-8?");
});

test("whoever waits gets the next message the moment it arrives, and nothing older", async () => {
  await send("waiter@customer.example", { subject: "Old" });
  const [old] = await listed("?to=waiter@customer.example");
  const next = listed(`?to=waiter@customer.example&after=${old?.id}&wait=20`);
  await send("waiter@customer.example", { subject: "New" });
  expect((await next).map(({ subject }) => subject)).toEqual(["New"]);
});

test("mail outlives a killed server", async () => {
  await send("kept@customer.example");
  await stopServer();
  await startServer();
  expect(await listed("?to=kept@customer.example")).toHaveLength(1);
});

test("a refusal is temporary, for one address and for as many messages as ordered", async () => {
  await order({ kind: "refuse", to: "refused@customer.example" });
  await expect(send("refused@customer.example")).rejects.toMatchObject({ responseCode: 451 });
  await send("other@customer.example");
  await send("refused@customer.example");
  expect(await listed("?to=refused@customer.example")).toHaveLength(1);
});

test("a dropped line leaves the message accepted and the sender in doubt", async () => {
  await order({ kind: "drop", to: "dropped@customer.example" });
  await expect(send("dropped@customer.example")).rejects.toThrow();
  expect(await listed("?to=dropped@customer.example")).toHaveLength(1);
});

test("a delayed answer comes after the message can be seen", async () => {
  await order({ kind: "delay", to: "late@customer.example", seconds: 1 });
  let answered = false;
  const sent = send("late@customer.example").then(() => {
    answered = true;
  });
  expect(await listed("?to=late@customer.example&wait=20")).toHaveLength(1);
  expect(answered).toBe(false);
  await sent;
});

test("an unknown fault is refused", async () => {
  expect((await order({ kind: "explode" })).status).toBe(400);
});

test("what a mail brings cannot run or leave its frame, nor break the pages around it", async () => {
  await send("script@customer.example", { subject: "<script>alert(1)</script>", html: "<script>alert(2)</script>" });
  const [message] = await listed("?to=script@customer.example");
  const around = await (await fetch(`${http}/messages/${message?.id}`)).text();
  expect(around).not.toContain("<script>");
  expect(await (await fetch(`${http}/?to=script@customer.example`)).text()).not.toContain("<script>");
  const inside = await fetch(`${http}/messages/${message?.id}/html`);
  expect(inside.headers.get("content-security-policy")).toMatch(/^sandbox (?!.*allow-scripts)/);
});

test("clearing takes the messages of one address only, and not on the word of another site", async () => {
  await send("cleared@customer.example");
  await send("stays@customer.example");
  const url = `${http}/api/messages?to=cleared@customer.example`;
  const foreign = await fetch(url, { method: "DELETE", headers: { "sec-fetch-site": "cross-site" } });
  expect(foreign.status).toBe(403);
  expect(await (await fetch(url, { method: "DELETE" })).json()).toEqual({ cleared: 1 });
  expect(await listed("?to=stays@customer.example")).toHaveLength(1);
});
