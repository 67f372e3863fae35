import { Body, Button, Container, Head, Heading, Html, Link, Preview, Text } from "react-email";
import type { MailTemplate } from "@/lib/domain/messages/events";
import { LOOK } from "./look";

/** What a letter of a kind is made of; `url` is absolute. */
export type MailOf<T extends MailTemplate["template"]> = Extract<MailTemplate, { template: T }> & { url: string };

type LetterProps = { companyName: string; title: string; children: React.ReactNode };

/** The one frame of every e-mail. */
export function Letter({ companyName, title, children }: LetterProps) {
  return (
    <Html lang="en-US">
      <Head>
        <title>{title}</title>
      </Head>
      <Preview>{`${companyName}: ${title}`}</Preview>
      <Body style={{ background: LOOK.ground, color: LOOK.ink, fontFamily: LOOK.font, margin: 0, padding: "24px 8px" }}>
        <Container style={{ background: LOOK.surface, border: `1px solid ${LOOK.line}`, maxWidth: 560, padding: 24 }}>
          <Text style={{ color: LOOK.steel, fontSize: 14, margin: 0 }}>{companyName}</Text>
          <Heading as="h1" style={{ fontSize: 22, margin: "8px 0 16px" }}>
            {title}
          </Heading>
          {children}
        </Container>
      </Body>
    </Html>
  );
}

export function Line({ children }: { children: React.ReactNode }) {
  return <Text style={{ fontSize: 16, lineHeight: "24px", margin: "0 0 16px" }}>{children}</Text>;
}

export function Note({ children }: { children: React.ReactNode }) {
  return <Text style={{ color: LOOK.steel, fontSize: 14, lineHeight: "20px", margin: "16px 0 0" }}>{children}</Text>;
}

/** The step to take, and its address for programs that draw no buttons; in plain text the address stands anyway. */
export function Step({ url, children }: { url: string; children: React.ReactNode }) {
  return (
    <>
      <Button
        href={url}
        style={{ background: LOOK.still, borderRadius: 6, color: LOOK.onStill, fontSize: 16, padding: "12px 20px" }}
      >
        {children}
      </Button>
      <Text
        data-skip-in-text="true"
        style={{ color: LOOK.steel, fontSize: 12, margin: "12px 0 0", wordBreak: "break-all" }}
      >
        Or open{" "}
        <Link href={url} style={{ color: LOOK.still }}>
          {url}
        </Link>
      </Text>
    </>
  );
}
