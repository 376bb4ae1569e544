import { beforeAll, expect, test } from "vitest";
import {
  CRASH_ROWS,
  crashTemplate,
  finished,
  forget,
  killedAfter,
  standing,
} from "@/tests/helpers/delivery-crash";

let template: string;
beforeAll(async () => {
  template = await crashTemplate();
});

const nothing = { shapes: 0, revisions: 0, figures: 0, finder: 0, logged: 0 };
const all = {
  shapes: CRASH_ROWS,
  revisions: CRASH_ROWS,
  figures: 2 * CRASH_ROWS,
  finder: CRASH_ROWS,
  logged: 1,
};

test.each([900, 1_600])(
  "killed %i ms after it began, a put-away is all there or not at all, and the next start finishes it",
  async (waitMs) => {
    const file = await killedAfter(template, waitMs);
    const after = await standing(file);
    expect(after.damage).toBe("ok");
    expect([nothing, all]).toContainEqual({
      shapes: after.shapes,
      revisions: after.revisions,
      figures: after.figures,
      finder: after.finder,
      logged: after.logged,
    });
    expect(after.state).toBe(after.shapes === 0 ? "putting-away" : "put-away");
    await finished(file);
    expect(await standing(file)).toMatchObject({ ...all, state: "put-away", damage: "ok" });
    forget(file);
  },
);
