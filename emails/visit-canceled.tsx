import { Letter, Line, type MailOf, Note } from "./letter";
import { previewOfVisit, VisitFacts } from "./visit-facts";

type Props = MailOf<"visit-canceled">;

export const preview: Props = {
  ...previewOfVisit,
  template: "visit-canceled",
  liveBlocks: [],
  reason: "The building lost its window that day.",
  url: "https://coastdown.example/",
};

export const subject = ({ site, title }: Props) => `Canceled: ${title}, ${site.name}`;

export function VisitCanceled({ template: _, url: __, reason, ...visit }: Props) {
  return (
    <Letter companyName={visit.companyName} title="A visit does not take place">
      <Line>{visit.contactName}, this visit is canceled. Nothing operates, and nobody comes.</Line>
      <VisitFacts {...visit} liveBlocks={[]} crew={[]} />
      <Line>Reason: {reason}</Line>
      <Note>Questions: {visit.companyPhone}.</Note>
    </Letter>
  );
}
