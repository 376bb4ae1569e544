import "server-only";
import type { Db } from "@/db/client";
import { createOrganisation } from "@/lib/commands/create-organisation";
import type { Actor, Role } from "@/lib/schemas/access";
import { createBay } from "@/lib/services/bay/create";
import type { Ctx } from "@/lib/services/context";
import { newId } from "@/lib/services/new-id";
import { checkRevision } from "@/lib/services/revision/check";
import { releaseRevision } from "@/lib/services/revision/release";
import { submitRevision } from "@/lib/services/revision/submit";
import { putRight } from "@/lib/services/right/put";
import { createShape } from "@/lib/services/shape/create";
import { builtUpShapes } from "./built-up";
import { DEMO_BAYS, DEMO_PASSWORD, DEMO_PEOPLE, FIRM, type DemoBay } from "./firm";
import { rolledShapes } from "./rolled";
import type { DemoShape } from "./shape";

type As = (role: Role) => Ctx;

/** The demo organisation, made by its own people through the verbs; the figures are the engine's. */
export const seedDemo = async (db: Db, now = Date.now()): Promise<void> => {
  const [first, ...others] = DEMO_PEOPLE.map((person) => ({ ...person, password: DEMO_PASSWORD }));
  const actors = await createOrganisation(db, { ...FIRM, people: [first!, ...others], now });
  const as: As = (role) => ({ actor: actorOf(actors, role), db, now, requestId: newId() });

  const bays = new Map<DemoBay, string>();
  for (const name of DEMO_BAYS) {
    const counts = name === "Rolled beams" || name === "Rolled columns" ? "tabulated" : "computed";
    bays.set(name, (await createBay({ ctx: as("admin"), input: { name, counts } })).id);
  }
  await putRight({
    ctx: as("admin"),
    input: {
      memberId: actorOf(actors, "designer").membershipId,
      bayId: bays.get("Job specials")!,
      right: "draft",
    },
  });
  for (const shape of [...rolledShapes(), ...builtUpShapes()]) await addShape(as, bays, shape);
};

const actorOf = (actors: readonly Actor[], role: Role): Actor => {
  const found = actors.find((actor) => actor.role === role);
  if (!found) throw new Error(`the demo has no ${role}`);
  return found;
};

/** Drafted and submitted by the engineer, checked by the admin, released by the librarian: as far as the shape has come. */
const addShape = async (as: As, bays: ReadonlyMap<DemoBay, string>, shape: DemoShape): Promise<void> => {
  const { bay, family, designation, title, drawing, note = "", state = "released" } = shape;
  const input = { bayId: bays.get(bay)!, family, designation, title, note, drawing };
  const made = await createShape({ ctx: as("engineer"), input });
  const address = { shapeId: made.id, ordinal: 1 };
  if (state === "draft") return;
  const submitted = await submitRevision({ ctx: as("engineer"), ...address, version: made.revision.version });
  if (state === "submitted") return;
  const checked = await checkRevision({
    ctx: as("admin"),
    ...address,
    version: submitted.version,
    input: { how: "review" },
  });
  await releaseRevision({ ctx: as("librarian"), ...address, version: checked.version });
};
