import { Section } from "react-email";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import { clockOf } from "@/lib/domain/visits/clock";
import type { VisitLetter } from "@/lib/domain/visits/letter";
import { spanWords } from "@/lib/domain/visits/times";
import { Line, Note } from "./letter";
import { LOOK } from "./look";

/** What, where, when and who: the same in every letter about a visit. */
export function VisitFacts(visit: VisitLetter) {
  return (
    <Section style={{ borderLeft: `4px solid ${LOOK.still}`, margin: "0 0 16px", paddingLeft: 16 }}>
      <Line>
        <strong>{visit.title}</strong>
        <br />
        {visit.site.name}, {visit.site.address}
        <br />
        {spanWords(visit)}
      </Line>
      {visit.liveBlocks.map((block) => (
        <Line key={block.startsLocal + block.functions.join()}>
          Really operates from {clockOf(block.startsLocal)} to {clockOf(block.endsLocal)}:{" "}
          {block.functions.map((one) => FUNCTION_WORDS[one].toLowerCase()).join(", ")}.
          {block.attendees.length > 0 && ` Standing by: ${block.attendees.join(", ")}.`}
        </Line>
      ))}
      {visit.crew.length > 0 && <Line>Who comes: {visit.crew.join(", ")}</Line>}
    </Section>
  );
}

export const Caution = ({ companyPhone }: { companyPhone: string }) => (
  <Note>
    Occupants and the supervising station are told before anything operates. Local codes and the authority having
    jurisdiction decide what may be done when. Times are those of the site’s clock. Questions: {companyPhone}.
  </Note>
);

/** For the pictures of letters. */
export const previewOfVisit: VisitLetter = {
  companyName: "Harbor Lane Fire Alarm",
  companyPhone: "312-555-0100",
  contactName: "Renata Oduya",
  site: { name: "Quay Street Library", address: "4 Quay Street, Port Ansel, WA 98599" },
  title: "Yearly fan shutdown test",
  crew: ["Dara Whitcomb", "Ignacio Bello"],
  startsLocal: "2026-12-15T06:00",
  endsLocal: "2026-12-15T10:00",
  liveBlocks: [
    {
      functions: ["fan_shutdown", "damper_close"],
      startsLocal: "2026-12-15T06:30",
      endsLocal: "2026-12-15T07:30",
      attendees: ["building engineer"],
    },
  ],
  calendar: {
    uid: "0193c000-0000-7000-8000-000000000000",
    sequence: 0,
    startsAt: "2026-12-15T14:00:00.000Z",
    endsAt: "2026-12-15T18:00:00.000Z",
    writtenAt: "2026-12-01T18:00:00.000Z",
  },
};
