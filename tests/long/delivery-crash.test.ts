import { beforeAll, expect, test } from "vitest";
import {
  CRASH_ROWS,
  crashTemplate,
  finished,
  forget,
  killedAfter,
  standing,
} from "@/tests/helpers/delivery-crash";

const KILLS = 30;
const LONGEST_MS = 3_000;

let template: string;
beforeAll(async () => {
  template = await crashTemplate();
});

test(
  "killed 30 times at moments spread over it, a put-away is never half there",
  async () => {
    const seen = new Set<number>();
    for (let i = 0; i < KILLS; i += 1) {
      const file = await killedAfter(template, Math.round((i * LONGEST_MS) / (KILLS - 1)));
      const after = await standing(file);
      expect(after.damage).toBe("ok");
      expect([0, CRASH_ROWS]).toContain(after.shapes);
      expect(after).toMatchObject({
        revisions: after.shapes,
        finder: after.shapes,
        figures: 2 * after.shapes,
        logged: after.shapes === 0 ? 0 : 1,
      });
      seen.add(after.shapes);
      if (i % 5 === 0) {
        await finished(file);
        expect((await standing(file)).shapes).toBe(CRASH_ROWS);
      }
      forget(file);
    }
    expect(seen.size, "kills fell before the end as well as after it").toBe(2);
  },
  10 * 60_000,
);
