import { buffer } from "node:stream/consumers";
import { setTimeout as pause } from "node:timers/promises";
import { SMTPServer } from "smtp-server";

const refusal = () => Object.assign(new Error("Try again later"), { responseCode: 451 });

/** Accepts everything for everyone, except as the ordered faults say. */
export function smtpServer(store, faults) {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    disableReverseLookup: true,
    logger: false,
    async onData(stream, session, answer) {
      try {
        const raw = await buffer(stream);
        const to = session.envelope.rcptTo.map(({ address }) => address);
        const fault = faults.next(to);
        if (fault?.kind === "refuse") return answer(refusal());
        await store.add(session.envelope.mailFrom.address ?? "", to, raw);
        if (fault?.kind === "delay") await pause(fault.seconds * 1000);
        if (fault?.kind === "drop") return cut(server, session);
        answer(null, "Kept");
      } catch (error) {
        answer(error);
      }
    },
  });
  // A sender that vanishes in the middle is part of what this server is for.
  server.on("error", () => {});
  return server;
}

function cut(server, session) {
  for (const connection of server.connections) if (connection.session === session) connection._socket.destroy();
}
