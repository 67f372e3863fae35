import { simpleParser } from "mailparser";
import { SMTPServer, type SMTPServerDataStream } from "smtp-server";

export type Received = { to: string; messageId: string; subject: string; text: string };

/** A mail server of one test: keeps what it accepts, and refuses or holds back addresses as told. */
export async function mailServer() {
  const received: Received[] = [];
  const refused = new Map<string, number>();
  const held = new Map<string, () => void>();
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    onRcptTo({ address }, _session, done) {
      const code = refused.get(address);
      done(code ? Object.assign(new Error("not now"), { responseCode: code }) : null);
    },
    onData(stream, session, done) {
      const to = session.envelope.rcptTo[0]?.address ?? "";
      const arrived = held.get(to);
      if (arrived) {
        stream.resume();
        stream.once("end", arrived);
        return;
      }
      keep(stream, to).then(() => done(), done);
    },
  });
  // A client that was killed is no trouble of the server's.
  server.on("error", () => {});
  async function keep(stream: SMTPServerDataStream, to: string) {
    const { messageId = "", subject = "", text = "" } = await simpleParser(stream);
    received.push({ to, messageId, subject, text });
  }
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const address = server.server.address();
  if (!address || typeof address === "string") throw new Error("the mail server has no port");
  return {
    url: `smtp://127.0.0.1:${address.port}`,
    /** What arrived for an address. */
    to: (address: string) => received.filter((one) => one.to === address),
    refuse: (address: string, code: number) => refused.set(address, code),
    accept: (address: string) => refused.delete(address),
    /** Takes the letter but never says so; answers when it is there. */
    hold: (address: string) => new Promise<void>((resolve) => held.set(address, resolve)),
    letGo: (address: string) => held.delete(address),
    close: () => new Promise<void>((resolve) => server.close(resolve)),
  };
}
