import { z } from "zod";

const whole = (fallback: number, min: number, max: number) =>
  z
    .string()
    .trim()
    .regex(/^\d+$/, "must be a whole number")
    .transform(Number)
    .pipe(z.number().int().min(min).max(max))
    .default(fallback);

const origin = z
  .string()
  .trim()
  .refine(
    (text) =>
      URL.canParse(text) && /^https?:\/\//.test(text) && new URL(text).origin === text.replace(/\/$/, ""),
    "must be an origin such as https://book.example.com, without a path",
  )
  .transform((text) => new URL(text).origin);

const Environment = z.object({
  PORT: whole(3000, 0, 65_535),
  HOST: z.string().trim().min(1).default("127.0.0.1"),
  DATABASE_URL: z
    .string()
    .trim()
    .regex(/^(file:|https?:\/\/|libsql:\/\/|wss?:\/\/)/, "must begin with file:, http(s):// or libsql://")
    .default("file:./data/flitchbook.db"),
  DATABASE_AUTH_TOKEN: z.string().trim().min(1).optional(),
  /** Where people reach the program. With it nothing is seeded and cookies are Secure when it is https. */
  PUBLIC_ORIGIN: origin.optional(),
  SESSION_IDLE_MINUTES: whole(60, 1, 43_200),
  SESSION_HOURS: whole(12, 1, 8_760),
  /** How many proxies in front may be believed in X-Forwarded-For. */
  TRUSTED_PROXIES: whole(0, 0, 10),
  SMTP_URL: z
    .string()
    .trim()
    .regex(/^smtps?:\/\//, "must begin with smtp:// or smtps://")
    .optional(),
  MAIL_FROM: z.string().trim().min(3).default("Flitchbook <flitchbook@localhost>"),
  LOG_LEVEL: z.enum(["trace", "debug", "info", "warn", "error", "silent"]).default("info"),
});

export type Environment = z.infer<typeof Environment>;

/** Reads an environment; blank variables count as missing. Throws one line that names each wrong variable. */
export const parseEnvironment = (source: Readonly<Record<string, string | undefined>>): Environment => {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value?.trim()));
  const parsed = Environment.safeParse(given);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => `${issue.path.join(".")} ${issue.message}`);
  throw new Error(`Environment: ${faults.join("; ")}`);
};

let read: Environment | undefined;

/** The environment, parsed at first use so that the build can import this file. */
export const environment = (): Environment => (read ??= parseEnvironment(process.env));

/** Without PUBLIC_ORIGIN the program is the demo, seeded and bound to loopback. */
export const isDemo = (): boolean => environment().PUBLIC_ORIGIN === undefined;
