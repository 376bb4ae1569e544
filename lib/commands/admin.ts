import { randomBytes } from "node:crypto";
import { parseArgs } from "node:util";
import { z } from "zod";
import { CommandRefusal, guarded, withDatabase } from "./command";
import { createOrganisation } from "./create-organisation";

const USAGE =
  'Use: npm run admin -- create --organisation "Name of the firm" --email admin@example.com [--name "A. Admin"]';

const Wanted = z.object({
  organisation: z.string().trim().min(1).max(120),
  email: z.email().max(254),
  name: z.string().trim().min(1).max(120).optional(),
});

const wanted = (args: readonly string[]): z.infer<typeof Wanted> => {
  const [verb, ...rest] = args;
  if (verb !== "create") throw new CommandRefusal(USAGE);
  try {
    const { values } = parseArgs({
      args: [...rest],
      options: { organisation: { type: "string" }, email: { type: "string" }, name: { type: "string" } },
    });
    const parsed = Wanted.safeParse(values);
    if (parsed.success) return parsed.data;
    const { path, message } = parsed.error.issues[0]!;
    throw new CommandRefusal(`--${path.join(".")}: ${message}. ${USAGE}`);
  } catch (error) {
    if (error instanceof CommandRefusal) throw error;
    throw new CommandRefusal(`${error instanceof Error ? error.message : String(error)}. ${USAGE}`);
  }
};

/** 120 random bits, in groups that can be read out. */
const freshPassword = (): string =>
  randomBytes(15)
    .toString("hex")
    .replace(/.{6}(?!$)/g, "$&-");

const create = async (): Promise<void> => {
  const { organisation, email, name = "Admin" } = wanted(process.argv.slice(2));
  await withDatabase(async (db) => {
    const password = freshPassword();
    await createOrganisation(db, {
      name: organisation,
      people: [{ email, name, role: "admin", password }],
      now: Date.now(),
    });
    process.stdout.write(
      `${organisation} is made. Sign in as ${email.toLowerCase()} with the password ${password} (shown this once), then change it.\n`,
    );
  });
};

void guarded(create);
