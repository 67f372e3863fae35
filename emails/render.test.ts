import { describe, expect, test } from "vitest";
import type { MailTemplate } from "@/lib/domain/messages/events";
import * as invitation from "./invitation";
import type { MailOf } from "./letter";
import * as passwordChanged from "./password-changed";
import * as passwordReset from "./password-reset";
import { renderMail } from "./render";
import * as signInLink from "./sign-in-link";
import * as visitAsked from "./visit-asked";
import * as visitCanceled from "./visit-canceled";
import * as visitMoved from "./visit-moved";

/** Every letter there is: one more does not compile until it stands here too. */
const LETTERS: { [T in MailTemplate["template"]]: MailOf<T> } = {
  invitation: invitation.preview,
  "sign-in-link": signInLink.preview,
  "password-reset": passwordReset.preview,
  "password-changed": passwordChanged.preview,
  "visit-asked": visitAsked.preview,
  "visit-moved": visitMoved.preview,
  "visit-canceled": visitCanceled.preview,
};

/** Says what has happened and asks for nothing, so it leads nowhere. */
const LEADS_NOWHERE = new Set<string>(["visit-canceled"]);

const SIGNS = `<b>Ash</b> & "Birch" <img src=x onerror=alert(1)>`;
const WRITTEN_BY_PEOPLE = new Set([
  "companyName",
  "companyPhone",
  "contactName",
  "invitedBy",
  "name",
  "roleWord",
  "address",
  "title",
  "crew",
  "attendees",
  "reason",
]);

/** The same letter with signs of HTML in every word that somebody typed. */
function withSigns<T>(value: T, key = ""): T {
  if (typeof value === "string") return (WRITTEN_BY_PEOPLE.has(key) ? SIGNS : value) as T;
  if (Array.isArray(value)) return value.map((one) => withSigns(one, key)) as T;
  if (value === null || typeof value !== "object") return value;
  return Object.fromEntries(Object.entries(value).map(([name, one]) => [name, withSigns(one, name)])) as T;
}

const SIGNS_IN_HTML = "&lt;b&gt;Ash&lt;/b&gt; &amp; &quot;Birch&quot;";

describe.each(Object.entries(LETTERS))("%s", (template, { url, ...letter }) => {
  test("has a subject, a title and a language, and says who writes", async () => {
    const { subject, html, text } = await renderMail(letter, url);
    expect(subject).toMatch(/\S/);
    expect(html).toMatch(/^<!DOCTYPE html/i);
    expect(html).toContain('<html dir="ltr" lang="en-US">');
    const title = /<title>([^<]+)<\/title>/.exec(html)?.[1];
    expect(html.match(/<h1[^>]*>([^<]+)<\/h1>/)?.[1]).toBe(title);
    for (const reading of [html, text]) expect(reading).toContain(letter.companyName);
    expect(text).not.toMatch(/<\/?\w|&\w+;/);
  });

  const steps = LEADS_NOWHERE.has(template) ? 0 : 1;
  test(`leads to ${steps} address, which stands in the plain text as often`, async () => {
    const awkward = `${url}?a=1&b=2`;
    const { html, text } = await renderMail(letter, awkward);
    const hrefs = [...html.matchAll(/href="([^"]+)"/g)].map(([, href]) => href);
    expect(new Set(hrefs)).toEqual(new Set(steps ? [awkward.replaceAll("&", "&amp;")] : []));
    expect(text.split(awkward)).toHaveLength(steps + 1);
    expect(text.match(/https?:/g) ?? []).toHaveLength(steps);
  });

  test("words with signs of HTML are shown as they are", async () => {
    const { subject, html, text } = await renderMail(withSigns(letter), url);
    expect(html).not.toMatch(/<(b|img)\b/);
    expect(html).toContain(SIGNS_IN_HTML);
    expect(text).toContain(SIGNS);
    expect(subject).not.toMatch(/&\w+;/);
  });
});
