import { describe, expect, test } from "vitest";
import * as invitation from "./invitation";
import * as passwordChanged from "./password-changed";
import * as passwordReset from "./password-reset";
import { renderMail } from "./render";
import * as signInLink from "./sign-in-link";

const LETTERS = [invitation.preview, passwordChanged.preview, passwordReset.preview, signInLink.preview];

describe.each(LETTERS.map((letter) => [letter.template, letter] as const))("%s", (_, { url, ...letter }) => {
  test("says who writes, and where to go, in HTML and in text", async () => {
    const { subject, html, text } = await renderMail(letter, url);
    expect(subject).not.toBe("");
    expect(html).toContain('lang="en-US"');
    expect(html).toContain(letter.companyName);
    expect(html).toContain(`href="${url.replaceAll("&", "&amp;")}"`);
    expect(text).toContain(letter.companyName);
    expect(text.split(url)).toHaveLength(2);
    expect(text).not.toMatch(/<\w/);
  });

  test("a name with signs of its own is shown as it is", async () => {
    const companyName = `Ash & "Birch" <b>Alarm</b>`;
    const { subject, html, text } = await renderMail({ ...letter, companyName }, url);
    expect(html).not.toContain("<b>Alarm");
    expect(html).toContain("&lt;b&gt;Alarm");
    expect(text).toContain(companyName);
    expect(subject).not.toMatch(/&\w+;/);
  });
});
