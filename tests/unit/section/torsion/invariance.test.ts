import { describe, expect, test } from "vitest";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion, movePoint, moveShape, type Motion } from "@/tests/helpers/torsion";
import { REFERENCE_SHAPES } from "@/tests/helpers/torsion-shapes";

const rolled = must(
  profileRegions({
    family: "channel",
    dimensions: { depth: 200, flangeWidth: 75, webThickness: 8.5, flangeThickness: 11.5, rootRadius: 11.5 },
  }),
)[0]!;

const shapes = [
  ...REFERENCE_SHAPES.filter(({ name }) => /block L|zed|two cells|250 × 15/.test(name)),
  { name: "rolled channel with fillets", region: rolled },
];

const motions: readonly (readonly [string, Motion])[] = [
  ["four times as large", { scale: 4 }],
  ["a fiftieth of the size", { scale: 0.02 }],
  ["turned by 90°", { degrees: 90 }],
  ["turned by 23°", { degrees: 23 }],
  ["moved by 3 m and 40 m", { dx: 3000, dy: -40_000 }],
  ["mirrored", { mirror: true }],
  ["mirrored, turned, moved and grown", { mirror: true, degrees: -71, dx: 250, dy: 17, scale: 1.7 }],
];

/** Two meshes of one shape differ; each result lies within its own estimate of the truth. */
describe.each(shapes)("$name", ({ region }) => {
  const before = connectedTorsion(sectionOfRegions([region]));

  test.each(motions)("%s, gives what the change asks for, within the estimates", (_, motion) => {
    const after = connectedTorsion(sectionOfRegions([moveShape(region, motion)]));
    const scale = motion.scale ?? 1;
    const allowed = (key: "J" | "Cw" | "shearCentre") => before.estimates[key] + after.estimates[key] + 1e-9;
    expectRel(after.J, before.J * scale ** 4, { rel: allowed("J"), name: "J" });
    expectRel(after.Cw, before.Cw * scale ** 6, { rel: allowed("Cw"), name: "Cw" });
    const moved = movePoint(before.shearCentre, motion);
    const size = before.r0 * scale;
    expectRel(after.shearCentre.x, moved.x, { rel: allowed("shearCentre"), scale: size, name: "xs" });
    expectRel(after.shearCentre.y, moved.y, { rel: allowed("shearCentre"), scale: size, name: "ys" });
    expectRel(after.r0, before.r0 * scale, { rel: 2 * allowed("shearCentre"), name: "r0" });
    expect(after.JBounds.lower).toBeLessThanOrEqual(after.JBounds.upper);
  });
});

test("a shape scaled by a power of two is computed to the same digits", () => {
  const { region } = REFERENCE_SHAPES.find(({ name }) => name === "block L")!;
  const [one, two] = [region, moveShape(region, { scale: 1024 })].map((r) =>
    connectedTorsion(sectionOfRegions([r])),
  );
  expectRel(two!.J, one!.J * 1024 ** 4, { rel: 1e-12 });
  expectRel(two!.Cw, one!.Cw * 1024 ** 6, { rel: 1e-11 });
});

test("the shear centre of a symmetric shape lies on its axis", () => {
  const channel = connectedTorsion(sectionOfRegions([rolled]));
  expectRel(channel.shearCentre.y, 0, { rel: 1e-12, scale: 100 });
  expect(channel.shearCentre.x).toBeLessThan(-37.5);
  expect(channel.betaX).toBe(0);
  expect(channel.betaY).toBeGreaterThan(0);
});
