import pino, { type Logger } from "pino";
import { env } from "@/lib/env";

let logger: Logger | undefined;

/** Structured, one line an event. Secrets never reach a line: these paths are cut wherever they appear. */
export function log(): Logger {
  logger ??= pino({
    level: env().LOG_LEVEL,
    redact: { paths: ["*.password", "*.token", "*.url", "*.hash"], censor: "[cut]" },
    base: null,
    timestamp: pino.stdTimeFunctions.isoTime,
  });
  return logger;
}
