import { render } from "react-email";
import type { MailTemplate } from "@/lib/domain/messages/events";
import { Letter } from "./letter";

export type RenderedMail = { subject: string; html: string; text: string };

type Parts = { subject: string; letter: React.ComponentProps<typeof Letter> };

const IGNORE = "If you did not ask for this, you need not do anything.";

/** What each e-mail says. `url` is absolute, and absent where a letter asks for nothing. */
function partsOf(mail: MailTemplate, url: string): Parts {
  const { companyName } = mail;
  switch (mail.template) {
    case "invitation":
      return {
        subject: `${mail.invitedBy} invites you to ${companyName}`,
        letter: {
          companyName,
          heading: `Welcome, ${mail.name}`,
          lines: [`${mail.invitedBy} invites you to ${companyName} as ${mail.roleWord.toLowerCase()}.`],
          button: { word: "Accept the invitation", url },
          footing: "The link works once, for 14 days.",
        },
      };
    case "sign-in-link":
      return {
        subject: `Your link to sign in to ${companyName}`,
        letter: {
          companyName,
          heading: "Sign in",
          lines: ["Here is the link that you asked for."],
          button: { word: "Sign in", url },
          footing: `The link works once, for 15 minutes. ${IGNORE}`,
        },
      };
    case "password-reset":
      return {
        subject: `Choose a new password for ${companyName}`,
        letter: {
          companyName,
          heading: "Choose a new password",
          lines: ["Somebody, probably you, asked for a new password."],
          button: { word: "Choose a password", url },
          footing: `The link works once, for an hour. ${IGNORE}`,
        },
      };
    case "password-changed":
      return {
        subject: "Your password was changed",
        letter: {
          companyName,
          heading: "Your password was changed",
          lines: [`${mail.name}, your password was changed just now, and you are signed out everywhere.`],
          footing: "If that was not you, choose a new password at once and tell the owner of your company.",
        },
      };
  }
}

export async function renderMail(mail: MailTemplate, url: string): Promise<RenderedMail> {
  const { subject, letter } = partsOf(mail, url);
  const element = <Letter {...letter} />;
  return { subject, html: await render(element), text: await render(element, { plainText: true }) };
}
