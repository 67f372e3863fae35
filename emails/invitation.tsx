import { INVITATION_DAYS } from "@/lib/domain/shared/link-validity";
import { Letter, Line, type MailOf, Note, Step } from "./letter";

type Props = MailOf<"invitation">;

export const preview: Props = {
  template: "invitation",
  companyName: "Harbor Lane Fire Alarm",
  invitedBy: "Ruth Adeyemi",
  name: "Tomas Lindqvist",
  roleWord: "Technician",
  url: "https://coastdown.example/invitation/preview",
};

export const subject = ({ invitedBy, companyName }: Props) =>
  invitedBy === companyName ? `Your place at ${companyName}` : `${invitedBy} invites you to ${companyName}`;

export function Invitation({ companyName, invitedBy, name, roleWord, url }: Props) {
  return (
    <Letter companyName={companyName} title={`Welcome, ${name}`}>
      <Line>
        {invitedBy} invites you to work with {companyName} here. Your role: {roleWord.toLowerCase()}.
      </Line>
      <Step url={url}>Accept the invitation</Step>
      <Note>The address works once, for {INVITATION_DAYS} days.</Note>
    </Letter>
  );
}
