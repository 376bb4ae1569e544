import fc from "fast-check";
import { expect, test } from "vitest";
import {
  bail,
  commit,
  mark,
  MAX_STEPS,
  preview,
  record,
  redo,
  startHistory,
  undo,
} from "@/lib/drawing/history";
import { moveParts, removeParts, reshapePart } from "@/lib/drawing/edit-parts";
import { mirrorParts, turnParts } from "@/lib/drawing/arrange-parts";
import type { Drawing } from "@/lib/drawing/schema";
import { girder } from "@/tests/helpers/drawings";

const gesture = fc.oneof(
  fc.record({ kind: fc.constant("move" as const), part: fc.nat(2), x: fc.integer({ min: -50, max: 50 }) }),
  fc.record({ kind: fc.constant("turn" as const), part: fc.nat(2), x: fc.integer({ min: -180, max: 180 }) }),
  fc.record({ kind: fc.constant("mirror" as const), part: fc.nat(2), x: fc.constant(0) }),
  fc.record({ kind: fc.constant("size" as const), part: fc.nat(2), x: fc.integer({ min: 1, max: 400 }) }),
  fc.record({ kind: fc.constant("delete" as const), part: fc.nat(2), x: fc.constant(0) }),
);
type Gesture = typeof gesture extends fc.Arbitrary<infer G> ? G : never;

const act = (drawing: Drawing, { kind, part, x }: Gesture): Drawing => {
  const id = ["tf", "web", "bf"][part] ?? "tf";
  switch (kind) {
    case "move":
      return moveParts(drawing, [id], { x, y: -x });
    case "turn":
      return turnParts(drawing, [id], x);
    case "mirror":
      return mirrorParts(drawing, [id], "upright");
    case "size":
      return reshapePart(drawing, id, { kind: "plate", width: x, height: 10 });
    case "delete":
      return removeParts(drawing, [id]);
  }
};

test("undo takes back every step and redo brings it again, whatever was done", () => {
  fc.assert(
    fc.property(fc.array(gesture, { maxLength: 40 }), (gestures) => {
      const states = [girder()];
      let h = startHistory(states[0] ?? girder());
      for (const g of gestures) {
        const next = act(h.now, g);
        h = record(h, next);
        if (next !== states.at(-1)) states.push(next);
      }
      const last = h.now;
      for (let i = states.length - 2; i >= 0; i--) {
        h = undo(h);
        expect(h.now).toEqual(states[i]);
      }
      expect(undo(h).now).toEqual(states[0]);
      for (let i = 1; i < states.length; i++) h = redo(h);
      expect(h.now).toEqual(last);
    }),
    { numRuns: 200 },
  );
});

test("a drag of many moves is one step", () => {
  let h = mark(startHistory(0));
  for (let i = 1; i <= 50; i++) h = preview(h, i);
  h = commit(h);
  expect(h.past).toEqual([0]);
  expect(undo(h).now).toBe(0);
});

test("Escape goes back to before the gesture and keeps what can be redone", () => {
  const undone = undo(record(startHistory("a"), "b"));
  const given = bail(preview(mark(undone), "c"));
  expect(given.now).toBe("a");
  expect(redo(given).now).toBe("b");
});

test("a gesture that changed nothing is no step", () => {
  expect(commit(mark(startHistory(1))).past).toEqual([]);
  const h = startHistory(1);
  expect(record(h, 1)).toBe(h);
});

test("200 steps are kept and the oldest go first", () => {
  let h = startHistory(0);
  for (let i = 1; i <= MAX_STEPS + 30; i++) h = record(h, i);
  expect(h.past).toHaveLength(MAX_STEPS);
  expect(h.past[0]).toBe(30);
});
