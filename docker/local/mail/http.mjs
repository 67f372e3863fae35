import { createServer } from "node:http";
import { json } from "node:stream/consumers";
import { inboxPage, messagePage } from "./pages.mjs";

const longestWait = 120;

const page = "text/html; charset=utf-8";
// A mail may bring its own styles and pictures, but runs nothing and fetches nothing.
const mailPolicy =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; img-src data: 'self'; style-src 'unsafe-inline'";
const pagePolicy =
  "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; form-action 'self'; base-uri 'none'";

const send = (status, type, body, headers = {}) => ({ status, type, body, headers });
const sendJson = (value, status = 200) => send(status, "application/json", `${JSON.stringify(value, null, 2)}\n`);
const sendPage = (html) => send(200, page, html, { "Content-Security-Policy": pagePolicy });
const notFound = () => send(404, "text/plain", "There is no such message.\n");

const filterOf = ({ searchParams }) => ({
  to: searchParams.get("to") || undefined,
  after: searchParams.get("after") ?? undefined,
});

function withPictures(message) {
  const html =
    message.html ||
    `<pre style="white-space:pre-wrap">${message.text.replace(/[&<]/g, (c) => (c === "&" ? "&amp;" : "&lt;"))}</pre>`;
  const place = (cid) => message.attachments.findIndex((a) => a.cid === cid);
  const shown = html.replace(
    /(["'(])cid:([^"')]+)/g,
    (_, open, cid) => `${open}/messages/${message.id}/attachments/${place(cid)}`,
  );
  return `<base target="_blank">${shown}`;
}

async function attachment(store, id, index) {
  const file = await store.attachment(id, Number(index));
  if (!file) return notFound();
  const name = encodeURIComponent(file.filename ?? "attachment");
  return send(200, file.contentType, file.content, { "Content-Disposition": `attachment; filename*=UTF-8''${name}` });
}

async function ofMessage(store, id, part, index) {
  const message = store.get(id);
  if (!message) return notFound();
  if (part === "html") return send(200, page, withPictures(message), { "Content-Security-Policy": mailPolicy });
  if (part === "raw")
    return send(200, "message/rfc822", store.raw(id), { "Content-Disposition": `attachment; filename="${id}.eml"` });
  if (part === "attachments") return attachment(store, id, index);
  return part ? notFound() : sendPage(messagePage(message));
}

async function listing(store, url, signal) {
  const wait = Math.min(Number(url.searchParams.get("wait") ?? 0), longestWait);
  return sendJson(wait > 0 ? await store.waitFor(filterOf(url), wait, signal) : store.list(filterOf(url)));
}

async function orderFault(faults, request) {
  try {
    faults.order(await json(request));
    return sendJson(faults.list(), 201);
  } catch (error) {
    return sendJson({ error: error.message }, 400);
  }
}

/** The whole interface, one line a route. */
async function route(store, faults, request, signal) {
  const url = new URL(request.url, "http://localhost");
  const [first, second, third, fourth] = url.pathname.split("/").filter(Boolean);
  switch (`${request.method} /${first === "api" ? `api/${second}${third ? "/…" : ""}` : (first ?? "")}`) {
    case "GET /":
      return sendPage(inboxPage(store.list(filterOf(url)).reverse(), filterOf(url).to ?? ""));
    case "GET /messages":
      return ofMessage(store, second, third, fourth);
    case "POST /clear":
      store.clear(filterOf(url));
      return send(303, "text/plain", "", { Location: "/" });
    case "GET /api/messages":
      return listing(store, url, signal);
    case "GET /api/messages/…":
      return store.get(third) ? sendJson(store.get(third)) : notFound();
    case "DELETE /api/messages":
      return sendJson({ cleared: store.clear(filterOf(url)) });
    case "GET /api/faults":
      return sendJson(faults.list());
    case "POST /api/faults":
      return orderFault(faults, request);
    case "DELETE /api/faults":
      faults.clear();
      return sendJson([]);
    default:
      return send(404, "text/plain", "Nothing is here.\n");
  }
}

// Pages of other sites may not empty the inbox or order faults through the visitor's browser.
const fromElsewhere = ({ method, headers }) => method !== "GET" && headers["sec-fetch-site"] === "cross-site";

export function httpServer(store, faults) {
  return createServer(async (request, response) => {
    const gone = new AbortController();
    response.once("close", () => gone.abort());
    const answer = fromElsewhere(request)
      ? send(403, "text/plain", "Not from another site.\n")
      : await route(store, faults, request, gone.signal).catch((error) => send(500, "text/plain", `${error.stack}\n`));
    if (response.destroyed) return;
    response.writeHead(answer.status, {
      "Content-Type": answer.type,
      "Cache-Control": "no-store",
      "X-Content-Type-Options": "nosniff",
      ...answer.headers,
    });
    response.end(answer.body);
  });
}
