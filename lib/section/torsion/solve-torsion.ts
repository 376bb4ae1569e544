import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import { everyNumberIsFinite } from "@/lib/section/finite";
import type { Absent } from "@/lib/section/properties";
import type { Section } from "@/lib/section/section";
import { stiffParts } from "@/lib/section/stiffness";
import { makeBody } from "@/lib/section/torsion/body";
import { jointFlows } from "@/lib/section/torsion/joint-flows";
import { buildMeshes } from "@/lib/section/torsion/mesh/build-meshes";
import type { MeshRegion } from "@/lib/section/torsion/mesh/boundary-graph";
import { chordsFor, meshRegions } from "@/lib/section/torsion/mesh-regions";
import { makePacer, type Pacer } from "@/lib/section/torsion/pacer";
import { shearAxes } from "@/lib/section/torsion/shear-axes";
import { solveBody, type BodySolution } from "@/lib/section/torsion/solve-body";
import { stressFields } from "@/lib/section/torsion/stress-fields";
import type { TorsionProperties } from "@/lib/section/torsion/torsion-properties";

export type TorsionOptions = Readonly<{
  /** Sample the stress fields for a picture. Default no. */
  fields?: boolean;
  /** More mesh points than this are refused. Default 60 000. */
  maxVertices?: number;
  /** Give up after this time, ms. Default none. */
  timeLimitMs?: number;
}>;

const MAX_VERTICES = 60_000;

/** Estimates above this are not left so: the mesh is graded further, then the degree raised. */
const GOOD_REL = 1e-3;

/** Mesh refinement at re-entrant corners and degree of the elements, tried in order until the estimates are good. */
const TRIES = [
  { refinement: 1, degree: 4 },
  { refinement: 2, degree: 4 },
  { refinement: 2, degree: 5 },
] as const;

type Try = Readonly<{ solutions: readonly BodySolution[]; degree: number }>;

const isGood = (solutions: readonly BodySolution[]): boolean =>
  solutions.every(({ estimates: { J, Cw, shearCentre } }) =>
    solutions.length > 1 ? J <= GOOD_REL : Math.max(J, Cw, shearCentre) <= GOOD_REL,
  );

function* attempt(
  regions: readonly MeshRegion[],
  refinement: number,
  degree: number,
  maxVertices: number,
  pacer: Pacer,
): Generator<void, Result<Try>> {
  const options = { maxVertices, refinement, chordsPerCircle: chordsFor(regions) };
  const meshes = yield* buildMeshes(regions, options, pacer);
  if (!meshes.ok) return meshes;
  const solutions: BodySolution[] = [];
  for (const mesh of meshes.value) {
    yield;
    const solved = yield* solveBody(makeBody(mesh, regions), degree, pacer);
    if (solved === null)
      return err({
        code: "torsion.notSolved",
        detail:
          "The torsion equations could not be solved for this outline. Leave out slivers and gaps far below a plate's thickness.",
      });
    solutions.push(solved);
  }
  return ok({ solutions, degree });
}

function* solveWell(
  regions: readonly MeshRegion[],
  maxVertices: number,
  pacer: Pacer,
): Generator<void, Result<Try>> {
  let best: Try | null = null;
  for (const { refinement, degree } of TRIES) {
    const tried: Result<Try> = yield* attempt(regions, refinement, degree, maxVertices, pacer);
    // A finer mesh can be too large where the first was not: then the first stands, with its estimates.
    if (!tried.ok) return best === null ? tried : ok(best);
    best = tried.value;
    if (isGood(best.solutions)) break;
  }
  return best === null
    ? err({ code: "torsion.noArea", detail: "There is no area to mesh: add a part." })
    : ok(best);
}

const NOT_CONNECTED = ["Cw", "shearCentre", "Avx", "Avy", "betaX", "betaY", "r0"] as const;

const notConnected = (bodies: number): readonly Absent[] =>
  NOT_CONNECTED.map((property) => ({
    property,
    code: "torsion.notConnected",
    detail: `The section is in ${bodies} pieces that do not touch along an edge. Each twists by itself: J is their sum, and there is no common shear centre.`,
  }));

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

const meshFacts = ({ solutions, degree }: Try): TorsionProperties["mesh"] => ({
  vertices: sum(solutions.map(({ body }) => body.mesh.x.length)),
  triangles: sum(solutions.map(({ body }) => body.mesh.region.length)),
  degree,
});

const ofSeveral = (tried: Try): TorsionProperties => {
  const { solutions } = tried;
  const J = sum(solutions.map((s) => s.J));
  return {
    J,
    JBounds: { lower: sum(solutions.map((s) => s.Jlower)), upper: sum(solutions.map((s) => s.Jupper)) },
    Cw: null,
    shearCentre: null,
    Avx: null,
    Avy: null,
    betaX: null,
    betaY: null,
    r0: null,
    estimates: {
      J: sum(solutions.map((s) => s.J * s.estimates.J)) / J,
      Cw: null,
      shearCentre: null,
      Avx: null,
      Avy: null,
    },
    bodies: solutions.length,
    joints: [],
    fields: null,
    mesh: meshFacts(tried),
    absent: notConnected(solutions.length),
    warnings: [],
  };
};

const ofOne = (
  section: Section,
  regions: readonly MeshRegion[],
  tried: Try,
  solution: BodySolution,
  fields: boolean,
): TorsionProperties | null => {
  const { body, warping, figures, J, Jlower, Jupper, estimates } = solution;
  const axes = shearAxes(section, {
    x: body.centroid.x + figures.shearCentre.x,
    y: body.centroid.y + figures.shearCentre.y,
  });
  if (axes === null) return null;
  const names = stiffParts(section).map(({ id }) => id);
  return {
    J,
    JBounds: { lower: Jlower, upper: Jupper },
    Cw: figures.Cw,
    ...axes,
    Avx: figures.Avx,
    Avy: figures.Avy,
    estimates,
    bodies: 1,
    joints: jointFlows(body, warping, (t) => regions[body.mesh.region[t]!]!.part, names, J),
    fields: fields ? stressFields(body, warping, J) : null,
    mesh: meshFacts(tried),
    absent: [],
    warnings: [],
  };
};

function* solve(section: Section, options: TorsionOptions): Generator<void, Result<TorsionProperties>> {
  const regions = meshRegions(section);
  if (regions.length === 0)
    return err({
      code: "torsion.noArea",
      detail: "No part counts for stiffness: there is nothing to twist.",
    });
  const tried = yield* solveWell(regions, options.maxVertices ?? MAX_VERTICES, makePacer());
  if (!tried.ok) return tried;
  const [first, ...more] = tried.value.solutions;
  const properties =
    first === undefined
      ? null
      : more.length > 0
        ? ofSeveral(tried.value)
        : ofOne(section, regions, tried.value, first, options.fields === true);
  const { fields, ...numbers } = properties ?? { fields: null };
  if (properties === null || !everyNumberIsFinite(numbers))
    return err({
      code: "torsion.notFinite",
      detail: "The sizes are beyond what can be computed: check them.",
    });
  return ok({ ...properties, fields });
}

/**
 * Torsion constant, warping constant, shear centre, shear areas, monosymmetry constants and joint flows of a section.
 * @param section disjoint parts in drawing axes, mm, noded against each other (`sectionOf` gives such); parts that count for
 * stiffness are taken. Touching along an edge counts as connected.
 * @returns figures with their error estimates, or `torsion.overlap`, `torsion.crossing`, `torsion.tooManyVertices`,
 * `torsion.timeOut`, `torsion.noArea`, `torsion.notSolved`, `torsion.notFinite`. Where an estimate exceeds 0.1 % the mesh at
 * re-entrant corners is refined once, then the degree raised.
 * @yields about every 8 ms: run it to the end with `next()`, or drop it to stop.
 * @source Finite elements of degree 4 on a Ruppert mesh for Saint-Venant's warping function and Prandtl's stress function;
 * formulas stand with the functions used here.
 */
export function* solveTorsion(
  section: Section,
  options: TorsionOptions = {},
): Generator<void, Result<TorsionProperties>> {
  const started = performance.now();
  const limit = options.timeLimitMs ?? Infinity;
  const steps = solve(section, options);
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
    if (performance.now() - started > limit)
      return err({
        code: "torsion.timeOut",
        detail: `Torsion took longer than ${limit} ms and was given up. Leave out details that do not matter.`,
      });
    yield;
  }
}
