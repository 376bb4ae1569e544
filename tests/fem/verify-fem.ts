import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { centralMoments } from "@/lib/geometry/moments";
import { sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion } from "@/tests/helpers/torsion";
import { REFERENCE_SHAPES, type ReferenceShape } from "@/tests/helpers/torsion-shapes";
import { pdeScript } from "@/tests/fem/pde-script";

/** What quadratic elements on an adapted mesh are good for here; ours are better. */
const PDE_REL = 1e-3;
const LIMIT_MS = 120_000;
const SOLVER = "FreeFem++";

/** Twelve of the reference shapes; the plate of 2500 × 8 is left out: adapting its mesh takes the other solver minutes. */
const shapes = REFERENCE_SHAPES.filter(({ name }) => name !== "plate 2500 × 8");

const solveElsewhere = (folder: string, { region }: ReferenceShape): readonly number[] => {
  const { centroid, moments } = centralMoments([{ regions: [region], weight: 1 }])!;
  const file = join(folder, "section.edp");
  writeFileSync(file, pdeScript(region, centroid, moments.area));
  const out = execFileSync(SOLVER, ["-nw", "-v", "0", file], { encoding: "utf8", timeout: LIMIT_MS });
  const line = out.split("\n").find((text) => text.startsWith("RESULT "));
  if (line === undefined) throw new Error(`no result from ${SOLVER}: ${out.slice(-400)}`);
  return line.split(" ").slice(1).map(Number);
};

const compare = (folder: string, shape: ReferenceShape): boolean => {
  const { centroid, moments } = centralMoments([{ regions: [shape.region], weight: 1 }])!;
  const rp = Math.sqrt((moments.xx + moments.yy) / moments.area);
  const found = connectedTorsion(sectionOfRegions([shape.region]));
  const [J, xs, ys, Cw, triangles] = solveElsewhere(folder, shape) as [
    number,
    number,
    number,
    number,
    number,
  ];
  const off = {
    J: found.J / J - 1,
    S: Math.hypot(found.shearCentre.x - centroid.x - xs, found.shearCentre.y - centroid.y - ys) / rp,
    Cw: found.Cw / Cw - 1,
  };
  const good = Object.values(off).every((value) => Math.abs(value) <= PDE_REL);
  const text = Object.entries(off).map(([key, value]) => `${key} ${value.toExponential(1)}`);
  process.stdout.write(
    `${good ? "agrees " : "DIFFERS"} ${shape.name}: ${text.join(", ")} (${triangles} triangles)\n`,
  );
  return good;
};

const installed = spawnSync(SOLVER, ["-nw", "-h"], { encoding: "utf8" }).error === undefined;
if (!installed)
  process.stdout.write(
    `Not compared: ${SOLVER} is not installed. On Debian: apt-get install --no-install-recommends freefem++\n`,
  );
else {
  const folder = mkdtempSync(join(tmpdir(), "fem-"));
  try {
    const results = shapes.map((shape) => compare(folder, shape));
    if (results.includes(false)) process.exitCode = 1;
  } finally {
    rmSync(folder, { recursive: true });
  }
}
