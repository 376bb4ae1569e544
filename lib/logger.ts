import "server-only";
import pino, { type Logger } from "pino";
import { environment } from "@/lib/env";

const store = globalThis as typeof globalThis & { flitchbookLogger?: Logger };

/**
 * One JSON object a line on stderr: time UTC, level, message, request id, ids of person and organisation. Never bodies,
 * cookies, tokens, passwords or query strings. Stdout is for the one line with the address.
 */
export const logger = (): Logger =>
  (store.flitchbookLogger ??= pino(
    {
      level: environment().LOG_LEVEL,
      base: null,
      messageKey: "message",
      timestamp: () => `,"time":"${new Date().toISOString()}"`,
      formatters: { level: (label) => ({ level: label }) },
    },
    pino.destination({ dest: 2, sync: true }),
  ));
