import { createServer } from "node:net";
import { Explained } from "./progress.mjs";

function listen(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(undefined));
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const { port: taken } = server.address();
      server.close(() => resolve(taken));
    });
  });
}

/** The first of the wished ports that is free, else any free one. */
export async function freePort(...wished) {
  for (const port of wished) if (port && (await listen(port))) return port;
  return listen(0);
}

/** The port of the application: the one asked for and no other, else the usual one, else a free one. */
export async function applicationPort() {
  const asked = process.env.PORT;
  if (!asked) return freePort(3000);
  if (!/^\d+$/.test(asked) || Number(asked) > 65_535) throw new Explained(`PORT is "${asked}", which is not a port.`);
  if (await listen(Number(asked))) return Number(asked);
  throw new Explained(`Port ${asked} is in use by another program. Choose another PORT, or none to take a free one.`);
}
