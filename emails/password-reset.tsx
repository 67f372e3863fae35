import { PASSWORD_RESET_HOURS } from "@/lib/domain/shared/link-validity";
import { Letter, Line, type MailOf, Note, Step } from "./letter";

type Props = MailOf<"password-reset">;

export const preview: Props = {
  template: "password-reset",
  companyName: "Harbor Lane Fire Alarm",
  url: "https://coastdown.example/reset/preview",
};

export const subject = ({ companyName }: Props) => `Choose a new password for ${companyName}`;

const span = PASSWORD_RESET_HOURS === 1 ? "an hour" : `${PASSWORD_RESET_HOURS} hours`;

export function PasswordReset({ companyName, url }: Props) {
  return (
    <Letter companyName={companyName} title="Choose a new password">
      <Line>Somebody, probably you, asked for a new password.</Line>
      <Step url={url}>Choose a password</Step>
      <Note>The address works once, for {span}. If you did not ask for it, your password stays as it is.</Note>
    </Letter>
  );
}
