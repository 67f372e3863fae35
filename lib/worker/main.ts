import { rawClient } from "@/db/client";
import { log } from "@/lib/log";
import { answerAccessRequests } from "./access-requests";
import { dueSweeper } from "./due-sweeps";
import { runOutbox } from "./outbox-runner";

/** What waits for a time is found by looking; everything else rings the bell. */
const LOOK_EVERY_MS = 5_000;

const clock = () => new Date();
let stopping = false;
let ring: () => void = () => {};

const bell = rawClient({ max: 1 });
await bell.listen("outbox", () => ring());

for (const signal of ["SIGTERM", "SIGINT"] as const) {
  process.once(signal, () => {
    stopping = true;
    ring();
  });
}

const nextBell = () =>
  new Promise<void>((resolve) => {
    const timer = setTimeout(resolve, LOOK_EVERY_MS);
    ring = () => {
      clearTimeout(timer);
      resolve();
    };
  });

const sweep = dueSweeper(clock);
log().info("worker ready");
while (!stopping) {
  const waiting = nextBell();
  try {
    await answerAccessRequests(clock);
    const taken = await runOutbox(clock, () => !stopping);
    if (taken > 0) continue;
    await sweep(() => !stopping);
  } catch (error) {
    log().error({ err: error }, "the worker stumbled");
  }
  await waiting;
}
log().info("worker stopped");
process.exit(0);
