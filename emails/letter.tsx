import { Body, Button, Container, Head, Heading, Html, Preview, Text } from "react-email";
import { LOOK } from "./look";

type LetterProps = {
  companyName: string;
  heading: string;
  lines: string[];
  button?: { word: string; url: string };
  footing?: string;
};

/** The one frame of every e-mail. */
export function Letter({ companyName, heading, lines, button, footing }: LetterProps) {
  return (
    <Html lang="en-US">
      <Head />
      <Preview>{lines[0] ?? heading}</Preview>
      <Body style={{ background: LOOK.ground, color: LOOK.ink, fontFamily: LOOK.font, margin: 0, padding: "24px 8px" }}>
        <Container style={{ background: LOOK.surface, border: `1px solid ${LOOK.line}`, maxWidth: 560, padding: 24 }}>
          <Text style={{ color: LOOK.steel, margin: 0 }}>{companyName}</Text>
          <Heading as="h1" style={{ fontSize: 22, margin: "8px 0 16px" }}>
            {heading}
          </Heading>
          {lines.map((line) => (
            <Text key={line} style={{ fontSize: 16, lineHeight: "24px" }}>
              {line}
            </Text>
          ))}
          {button && (
            <Button
              href={button.url}
              style={{
                background: LOOK.still,
                borderRadius: 6,
                color: LOOK.onStill,
                fontSize: 16,
                padding: "12px 20px",
              }}
            >
              {button.word}
            </Button>
          )}
          {footing && <Text style={{ color: LOOK.steel, fontSize: 14 }}>{footing}</Text>}
        </Container>
      </Body>
    </Html>
  );
}
