import { createServer } from "node:net";
import { Explained } from "./progress.mjs";

function listen(port) {
  return new Promise((resolve) => {
    const server = createServer((caller) => caller.destroy());
    server.once("error", () => resolve(undefined));
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const release = () => new Promise((closed) => server.close(closed));
      resolve({ port: server.address().port, release });
    });
  });
}

/** Holds the first of the wished ports that is free, else any free one, until `release` makes way for its user. */
export async function reservePort(...wished) {
  for (const port of wished) {
    const held = port && (await listen(port));
    if (held) return held;
  }
  return listen(0);
}

/** For a server that is started at once. */
export async function freePort(...wished) {
  const { port, release } = await reservePort(...wished);
  await release();
  return port;
}

/** The port of the application: the one asked for and no other, else the usual one, else a free one. */
export async function reserveApplicationPort() {
  const asked = process.env.PORT;
  if (!asked) return reservePort(3000);
  if (!/^\d+$/.test(asked) || Number(asked) > 65_535) throw new Explained(`PORT is "${asked}", which is not a port.`);
  const held = await listen(Number(asked));
  if (held) return held;
  throw new Explained(`Port ${asked} is in use by another program. Choose another PORT, or none to take a free one.`);
}
