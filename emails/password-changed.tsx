import { Letter, Line, type MailOf, Note, Step } from "./letter";

type Props = MailOf<"password-changed">;

export const preview: Props = {
  template: "password-changed",
  companyName: "Harbor Lane Fire Alarm",
  name: "Tomas Lindqvist",
  url: "https://coastdown.example/forgot",
};

export const subject = ({ companyName }: Props) => `Your password for ${companyName} was changed`;

export function PasswordChanged({ companyName, name, url }: Props) {
  return (
    <Letter companyName={companyName} title="Your password was changed">
      <Line>{name}, your password was changed, and you were signed out everywhere.</Line>
      <Line>If that was not you, choose a new one now and tell the owner of your company.</Line>
      <Step url={url}>Choose a new password</Step>
      <Note>If it was you, you need not do anything.</Note>
    </Letter>
  );
}
