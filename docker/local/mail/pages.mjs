const entities = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };
const safe = (text) => String(text).replace(/[&<>"']/g, (c) => entities[c]);
const size = (bytes) => (bytes < 10_000 ? `${bytes} bytes` : `${Math.round(bytes / 1000)} kB`);
const time = (iso) => `<time datetime="${iso}">${iso.slice(0, 10)} ${iso.slice(11, 19)} UTC</time>`;

const styles = `
:root { color-scheme: light dark; --paper: #f6f4ef; --ink: #17222d; --steel: #5b6b7a; --line: #d9d5cb; --still: #0e6b6b }
@media (prefers-color-scheme: dark) { :root { --paper: #17222d; --ink: #f6f4ef; --steel: #a9b5c0; --line: #394754; --still: #6cc4c4 } }
body { margin: 0 auto; max-width: 64rem; padding: 1.5rem; background: var(--paper); color: var(--ink);
  font: 1rem/1.5 "Atkinson Hyperlegible Next", system-ui, sans-serif }
a { color: var(--still) } h1 { font-size: 1.25rem; margin: 0 } header { display: flex; flex-wrap: wrap; gap: 1rem; align-items: center }
header form:last-child { margin-left: auto } small, time, dt { color: var(--steel) }
input, button { font: inherit; padding: .375rem .75rem; border: 1px solid var(--line); border-radius: .25rem; background: transparent; color: inherit }
ul { list-style: none; padding: 0 } li > a { display: grid; grid-template-columns: 1fr auto; gap: 0 1rem; padding: .75rem 0;
  border-top: 1px solid var(--line); text-decoration: none; color: inherit } li strong { color: var(--still) }
dl { display: grid; grid-template-columns: auto 1fr; gap: .25rem 1rem } dd { margin: 0; overflow-wrap: anywhere }
iframe { width: 100%; height: 60vh; border: 1px solid var(--line); background: #fff } pre { white-space: pre-wrap; overflow-wrap: anywhere }
details { border-top: 1px solid var(--line); padding: .5rem 0 } summary { cursor: pointer }`;

const frame = (title, body) => `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${safe(title)}</title><style>${styles}</style></head><body>${body}</body></html>`;

const row = (
  m,
) => `<li><a href="/messages/${m.id}"><strong>${safe(m.subject || "(no subject)")}</strong>${time(m.receivedAt)}
<small>to ${safe(m.to.join(", "))}</small>${m.attachments.length ? `<small>${m.attachments.length} attached</small>` : ""}</a></li>`;

export function inboxPage(messages, to) {
  const filter = to ? `?to=${encodeURIComponent(to)}` : "";
  const clear = messages.length
    ? `<form method="post" action="/clear${filter}"><button>Delete ${to ? "these" : "all"}</button></form>`
    : "";
  const list = messages.length
    ? `<ul>${messages.map(row).join("")}</ul>`
    : `<p>Nothing has been sent${to ? ` to ${safe(to)}` : ""} yet.</p>`;
  return frame(
    "Sent mail",
    `<header><h1>Sent mail</h1><form><label>To <input type="search" name="to" value="${safe(to)}"></label> <button>Show</button></form>${clear}</header>
<main>${list}</main>`,
  );
}

const attached = (id) => (a, i) =>
  `<dt>Attached</dt><dd><a href="/messages/${id}/attachments/${i}">${safe(a.name ?? a.type)}</a> <small>${size(a.size)}</small></dd>`;

export function messagePage(m) {
  return frame(
    m.subject,
    `<p><a href="/">Sent mail</a></p><h1>${safe(m.subject || "(no subject)")}</h1>
<dl><dt>From</dt><dd>${safe(m.from)}</dd><dt>To</dt><dd>${safe(m.to.join(", "))}</dd><dt>Received</dt><dd>${time(m.receivedAt)}</dd>
${m.attachments.map(attached(m.id)).join("")}</dl>
<iframe title="The message" sandbox="allow-popups allow-popups-to-escape-sandbox" src="/messages/${m.id}/html"></iframe>
<details><summary>Text</summary><pre>${safe(m.text)}</pre></details>
<details><summary>Headers</summary><pre>${safe(m.headers.join("\n"))}</pre></details>
<p><a href="/messages/${m.id}/raw">Message as sent</a></p>`,
  );
}
