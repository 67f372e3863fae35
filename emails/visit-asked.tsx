import { Letter, Line, type MailOf, Step } from "./letter";
import { Caution, previewOfVisit, VisitFacts } from "./visit-facts";

type Props = MailOf<"visit-asked">;

export const preview: Props = {
  ...previewOfVisit,
  template: "visit-asked",
  url: "https://coastdown.example/visits/preview",
};

export const subject = ({ site, title }: Props) => `Please confirm: ${title}, ${site.name}`;

export function VisitAsked({ url, template: _, ...visit }: Props) {
  return (
    <Letter companyName={visit.companyName} title="A visit is planned">
      <Line>{visit.contactName}, please look at this visit and say whether it can take place.</Line>
      <VisitFacts {...visit} />
      <Step url={url}>Look and answer</Step>
      <Caution companyPhone={visit.companyPhone} />
    </Letter>
  );
}
