import { spanWords } from "@/lib/domain/visits/times";
import { Letter, Line, type MailOf, Step } from "./letter";
import { Caution, previewOfVisit, VisitFacts } from "./visit-facts";

type Props = MailOf<"visit-moved">;

export const preview: Props = {
  ...previewOfVisit,
  template: "visit-moved",
  before: { startsLocal: "2026-12-14T06:00", endsLocal: "2026-12-14T10:00" },
  url: "https://coastdown.example/visits/preview",
};

export const subject = ({ site, title }: Props) => `Changed, please confirm: ${title}, ${site.name}`;

export function VisitMoved({ url, before, template: _, ...visit }: Props) {
  const was = spanWords(before);
  return (
    <Letter companyName={visit.companyName} title="A visit has changed">
      <Line>
        {visit.contactName}, this visit has changed{was !== spanWords(visit) && `; it stood at ${was}`}. What was
        answered before counts no longer: please look again.
      </Line>
      <VisitFacts {...visit} />
      <Step url={url}>Look and answer</Step>
      <Caution companyPhone={visit.companyPhone} />
    </Letter>
  );
}
