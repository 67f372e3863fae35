import { createElement, type ReactElement } from "react";
import { render } from "react-email";
import type { MailTemplate } from "@/lib/domain/messages/events";
import * as invitation from "./invitation";
import * as passwordChanged from "./password-changed";
import * as passwordReset from "./password-reset";
import * as signInLink from "./sign-in-link";
import * as visitAsked from "./visit-asked";
import * as visitCanceled from "./visit-canceled";
import * as visitMoved from "./visit-moved";

export type RenderedMail = { subject: string; html: string; text: string };

/** HTML and plain text from the same component. `url` is absolute. */
export function renderMail(mail: MailTemplate, url: string): Promise<RenderedMail> {
  switch (mail.template) {
    case "invitation":
      return both(invitation.subject, invitation.Invitation, { ...mail, url });
    case "sign-in-link":
      return both(signInLink.subject, signInLink.SignInLink, { ...mail, url });
    case "password-reset":
      return both(passwordReset.subject, passwordReset.PasswordReset, { ...mail, url });
    case "password-changed":
      return both(passwordChanged.subject, passwordChanged.PasswordChanged, { ...mail, url });
    case "visit-asked":
      return both(visitAsked.subject, visitAsked.VisitAsked, { ...mail, url });
    case "visit-moved":
      return both(visitMoved.subject, visitMoved.VisitMoved, { ...mail, url });
    case "visit-canceled":
      return both(visitCanceled.subject, visitCanceled.VisitCanceled, { ...mail, url });
  }
}

async function both<P extends object>(
  subject: (props: P) => string,
  letter: (props: P) => ReactElement,
  props: P,
): Promise<RenderedMail> {
  const element = createElement(letter, props);
  return { subject: subject(props), html: await render(element), text: await render(element, { plainText: true }) };
}
