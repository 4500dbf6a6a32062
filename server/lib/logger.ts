import pino, { type Logger } from "pino";

/** Structured logs. Cookies, authorisation, tokens, addresses and bodies never reach them. */
export function createLogger(level: string, destination?: pino.DestinationStream): Logger {
  const options = {
    level,
    redact: {
      paths: ["req.headers", "res.headers", "email", "*.email", "token", "*.token", "code", "*.code", "password"],
      remove: true,
    },
  };
  return destination ? pino(options, destination) : pino(options);
}

export type { Logger };
