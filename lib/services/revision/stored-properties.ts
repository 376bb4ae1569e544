import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { figures } from "@/db/schema/figures";
import type { Properties, TabulatedFigures } from "@/lib/schemas/properties";
import { found } from "../not-found";
import { PROPERTY_KEYS, type Scalars } from "../shape/figure-values";

const need = (values: Scalars, key: keyof Scalars): number => {
  const value = values[key];
  if (typeof value !== "number") throw new Error(`figures: ${key} is missing`);
  return value;
};

const pair = (x: number | null | undefined, y: number | null | undefined) =>
  typeof x === "number" && typeof y === "number" ? { x, y } : null;

/** Properties put together again from the columns and the rest of a computed row. */
export const propertiesOf = (values: Scalars, rest: string): Properties => {
  const others = JSON.parse(rest) as Pick<
    Properties,
    "estimates" | "plain" | "stressFactors" | "equalForceAxis" | "unsymmetrical" | "absent" | "warnings"
  >;
  const n = (key: keyof Scalars) => need(values, key);
  const m = (key: keyof Scalars) => values[key] ?? null;
  return {
    area: n("area"),
    perimeter: { outer: n("perimeter.outer"), inner: n("perimeter.inner") },
    mass: n("mass"),
    surface: n("surface"),
    centroid: { x: n("centroid.x"), y: n("centroid.y") },
    extents: {
      xMin: n("extents.xMin"),
      xMax: n("extents.xMax"),
      yMin: n("extents.yMin"),
      yMax: n("extents.yMax"),
    },
    Ix: n("Ix"),
    Iy: n("Iy"),
    Ixy: n("Ixy"),
    I1: n("I1"),
    I2: n("I2"),
    angle: n("angle"),
    SxTop: n("SxTop"),
    SxBottom: n("SxBottom"),
    SyLeft: n("SyLeft"),
    SyRight: n("SyRight"),
    Sx: n("Sx"),
    Sy: n("Sy"),
    S1: n("S1"),
    S2: n("S2"),
    Zx: m("Zx"),
    Zy: m("Zy"),
    Z1: m("Z1"),
    Z2: m("Z2"),
    pna: pair(m("pna.x"), m("pna.y")),
    equalForceAxis: others.equalForceAxis,
    Mp: pair(m("Mp.x"), m("Mp.y")),
    squash: m("squash"),
    rx: n("rx"),
    ry: n("ry"),
    r1: n("r1"),
    r2: n("r2"),
    J: m("J"),
    Cw: m("Cw"),
    shearCentre: pair(m("shearCentre.x"), m("shearCentre.y")),
    Avx: m("Avx"),
    Avy: m("Avy"),
    betaX: m("betaX"),
    betaY: m("betaY"),
    r0: m("r0"),
    estimates: others.estimates,
    plain: others.plain,
    stressFactors: others.stressFactors,
    unsymmetrical: others.unsymmetrical,
    absent: others.absent,
    warnings: others.warnings,
  };
};

type Stored = Readonly<{ computed: Properties; engineVersion: string; tabulated: TabulatedFigures | null }>;

/** Both kinds of figures of a revision. */
export const storedFigures = async (
  read: Pick<Reader | Tx, "select">,
  organisationId: string,
  revisionId: string,
): Promise<Stored> => {
  const rows = await read
    .select()
    .from(figures)
    .where(and(eq(figures.revisionId, revisionId), eq(figures.organisationId, organisationId)));
  const computed = found(rows.find((row) => row.source === "computed"));
  const table = rows.find((row) => row.source === "tabulated");
  return {
    computed: propertiesOf(computed, computed.rest),
    engineVersion: computed.engineVersion,
    tabulated:
      table === undefined
        ? null
        : Object.fromEntries(
            PROPERTY_KEYS.flatMap((key) => {
              const value = table[key];
              return value === null ? [] : [[key, value]];
            }),
          ),
  };
};
