import { EventEmitter } from "node:events";
import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { simpleParser } from "mailparser";

const hrefs = (html) => [...html.matchAll(/href="(https?:[^"]+)"/g)].map(([, url]) => url.replaceAll("&amp;", "&"));

/** What people and tests want to know of a message. */
async function summary(id, envelope, raw) {
  const mail = await simpleParser(raw, { skipTextToHtml: true });
  return {
    id,
    receivedAt: envelope.receivedAt,
    from: envelope.from,
    to: envelope.to,
    subject: mail.subject ?? "",
    messageId: mail.messageId ?? null,
    text: mail.text ?? "",
    html: mail.html || "",
    links: hrefs(mail.html || ""),
    headers: mail.headerLines.map(({ line }) => line.replace(/\r?\n\s*/g, " ")),
    attachments: mail.attachments.map(({ filename, contentType, size, cid }) => ({
      name: filename,
      type: contentType,
      size,
      cid,
    })),
  };
}

/** Messages on disk, `<id>.eml` with `<id>.json` for the envelope; ids rise with the order of arrival. */
export class MailStore {
  #messages = [];
  #arrivals = new EventEmitter().setMaxListeners(0);

  constructor(folder) {
    this.folder = folder;
    mkdirSync(folder, { recursive: true, mode: 0o700 });
  }

  async load() {
    // The envelope is written last, so a message without one was cut off while arriving and never accepted.
    const ids = readdirSync(this.folder)
      .filter((name) => name.endsWith(".json"))
      .map((name) => name.slice(0, -5));
    for (const id of ids.sort()) {
      this.#messages.push(
        await summary(id, JSON.parse(readFileSync(join(this.folder, `${id}.json`), "utf8")), this.raw(id)),
      );
    }
    return this;
  }

  async add(from, to, raw) {
    const envelope = { from, to: to.map((address) => address.toLowerCase()), receivedAt: new Date().toISOString() };
    const message = await summary("", envelope, raw);
    message.id = String(Math.max(Date.now(), Number(this.#messages.at(-1)?.id ?? 0) + 1));
    writeFileSync(join(this.folder, `${message.id}.eml`), raw, { mode: 0o600 });
    writeFileSync(join(this.folder, `${message.id}.new`), JSON.stringify(envelope), { mode: 0o600 });
    renameSync(join(this.folder, `${message.id}.new`), join(this.folder, `${message.id}.json`));
    this.#messages.push(message);
    this.#arrivals.emit("mail");
  }

  raw(id) {
    return readFileSync(join(this.folder, `${id}.eml`));
  }

  /** Oldest first. */
  list({ to, after = "" } = {}) {
    const wanted = to?.toLowerCase();
    return this.#messages.filter((m) => m.id > after && (!wanted || m.to.includes(wanted)));
  }

  get(id) {
    return this.list().find((message) => message.id === id);
  }

  /** The list as soon as it has an entry, or the empty list after so many seconds. */
  waitFor(filter, seconds, signal) {
    return new Promise((resolve) => {
      const finish = () => {
        this.#arrivals.off("mail", look);
        clearTimeout(timer);
        resolve(this.list(filter));
      };
      const look = () => this.list(filter).length > 0 && finish();
      const timer = setTimeout(finish, seconds * 1000);
      signal.addEventListener("abort", finish, { once: true });
      this.#arrivals.on("mail", look);
      look();
    });
  }

  async attachment(id, index) {
    const mail = await simpleParser(this.raw(id), { skipTextToHtml: true });
    return mail.attachments[index];
  }

  clear(filter) {
    const gone = new Set(this.list(filter).map(({ id }) => id));
    for (const id of gone)
      for (const end of ["json", "eml"]) rmSync(join(this.folder, `${id}.${end}`), { force: true });
    this.#messages = this.#messages.filter(({ id }) => !gone.has(id));
    return gone.size;
  }
}
