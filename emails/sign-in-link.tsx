import { SIGN_IN_LINK_MINUTES } from "@/lib/domain/shared/link-validity";
import { Letter, Line, type MailOf, Note, Step } from "./letter";

type Props = MailOf<"sign-in-link">;

export const preview: Props = {
  template: "sign-in-link",
  companyName: "Harbor Lane Fire Alarm",
  url: "https://coastdown.example/sign-in/confirm?token=preview",
};

export const subject = ({ companyName }: Props) => `Sign in to ${companyName}`;

export function SignInLink({ companyName, url }: Props) {
  return (
    <Letter companyName={companyName} title="Sign in">
      <Line>You asked to sign in without a password.</Line>
      <Step url={url}>Sign in</Step>
      <Note>
        The address works once, for {SIGN_IN_LINK_MINUTES} minutes. If you did not ask for it, you need not do anything.
      </Note>
    </Letter>
  );
}
