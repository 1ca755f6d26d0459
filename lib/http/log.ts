import pino from "pino";
import { env } from "@/lib/env";
import { loggableError } from "./loggable-error";

let logger: pino.Logger | undefined;

/** Structured log, one JSON object a line. Names that could carry a secret are cut out whatever is logged. */
export function log(): pino.Logger {
  logger ??= pino({
    level: env().LOG_LEVEL,
    base: { service: process.env.BOARDWAKE_SERVICE ?? "app" },
    serializers: { err: loggableError },
    redact: {
      paths: [
        "password",
        "token",
        "secret",
        "cookie",
        "authorization",
        "*.password",
        "*.token",
        "*.secret",
        "*.cookie",
        "*.authorization",
      ],
      censor: "[cut]",
    },
  });
  return logger;
}
