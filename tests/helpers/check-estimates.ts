import { expect } from "vitest";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing } from "@/lib/drawing/schema";
import { NO_CW_REL } from "@/lib/section/torsion/estimates";
import { meshRegions, chordsFor } from "@/lib/section/torsion/mesh-regions";
import { buildMeshes } from "@/lib/section/torsion/mesh/build-meshes";
import { makeBody } from "@/lib/section/torsion/body";
import { makePacer } from "@/lib/section/torsion/pacer";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import { solveBody } from "@/lib/section/torsion/solve-body";
import { connectedTorsion } from "@/tests/helpers/torsion";
import { must } from "@/tests/helpers/must";

/** Mesh four times finer at re-entrant corners and a degree higher than any run of the program. */
const FINER = { refinement: 8, degree: 6 };

/** What rounding leaves of a result, over and above the estimates. */
const ROUNDING_REL = 1e-9;

/**
 * Solves a drawing as the program does and again much finer, and expects the difference within the estimates, the bounds
 * in order and every estimate small. Chords of arcs are the same in both, so that their part of the estimate is not used.
 */
export const expectWithinEstimates = (drawing: Drawing): void => {
  const section = sectionOf(drawing);
  if (!section.ok) throw new Error(JSON.stringify(section.error));
  const found = connectedTorsion(section.value);
  const regions = meshRegions(section.value);
  const meshes = must(
    runToEnd(
      buildMeshes(
        regions,
        { maxVertices: 200_000, refinement: FINER.refinement, chordsPerCircle: chordsFor(regions) },
        makePacer(),
      ),
    ),
  );
  const body = makeBody(meshes[0]!, regions);
  const fine = runToEnd(solveBody(body, FINER.degree, makePacer()))!;
  const rp = Math.sqrt((body.Ixx + body.Iyy) / body.area);
  const { figures } = fine;
  const moved = Math.hypot(
    found.shearCentre.x - body.centroid.x - figures.shearCentre.x,
    found.shearCentre.y - body.centroid.y - figures.shearCentre.y,
  );
  const errors = {
    J: Math.abs(found.J / fine.J - 1),
    shearCentre: moved / rp,
    Cw: Math.abs(found.Cw - figures.Cw) / Math.max(found.Cw, NO_CW_REL * rp ** 4 * body.area),
  };
  for (const key of ["J", "shearCentre", "Cw"] as const)
    expect(errors[key], `${key} against its estimate ${found.estimates[key]}`).toBeLessThanOrEqual(
      // The snap of the shear centre onto the centroid is 1e-6 r_p.
      found.estimates[key] + (key === "shearCentre" ? 2e-6 : ROUNDING_REL),
    );
  expect(found.JBounds.lower).toBeLessThanOrEqual(found.JBounds.upper);
  expect(fine.J).toBeGreaterThanOrEqual(
    found.JBounds.lower * (1 - ROUNDING_REL) - (fine.Jupper - fine.Jlower),
  );
  expect(fine.J).toBeLessThanOrEqual(found.JBounds.upper * (1 + ROUNDING_REL) + (fine.Jupper - fine.Jlower));
};
