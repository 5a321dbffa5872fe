import "server-only";
import pino from "pino";
import { env } from "@/lib/config/env";

let logger: pino.Logger | undefined;

/** Structured log on standard output. Never log a secret, a token or an exact point of a sensitive site. */
export function log(): pino.Logger {
  logger ??= pino({ level: env().LOG_LEVEL });
  return logger;
}
