import { edgeLength } from "@/lib/geometry/arc";
import { nearestRegion } from "@/lib/geometry/boundary-distance";
import { edgeOf, pointOnEdge } from "@/lib/geometry/edge";
import type { Point, Region } from "@/lib/geometry/region";
import { TOUCH_MM } from "@/lib/geometry/tolerance";
import type { ContactLine, Section, SectionPart } from "@/lib/section/section";

/** One connected piece of a part: a part that a cut-out parts in two has two. */
export type Piece = Readonly<{ part: SectionPart; region: Region }>;

/** A run of contact lines between two pieces that hang together end to end; `ends` are indices of pieces. */
export type Seam = Readonly<{
  ends: readonly [number, number];
  lines: readonly ContactLine[];
  width: number;
}>;

const arcEdge = (line: ContactLine) =>
  edgeOf(line.bulge === undefined ? line.from : { ...line.from, bulge: line.bulge }, line.to);

const lineLength = (line: ContactLine): number => edgeLength(arcEdge(line).from, line.to);

const pieceAt = (pieces: readonly Piece[], partId: string, p: Point): number => {
  const own = pieces.flatMap(({ part, region }, i) => (part.id === partId ? [{ i, region }] : []));
  const nearest = nearestRegion(
    own.map(({ region }) => region),
    p,
  );
  return (own.length === 1 ? own[0] : own[nearest])?.i ?? -1;
};

const meet = (a: Point, b: Point): boolean => Math.hypot(a.x - b.x, a.y - b.y) <= TOUCH_MM;

const joined = (a: ContactLine, b: ContactLine): boolean =>
  meet(a.from, b.from) || meet(a.from, b.to) || meet(a.to, b.from) || meet(a.to, b.to);

/** Lines sorted into runs that hang together. */
const runsOf = (lines: readonly ContactLine[]): readonly (readonly ContactLine[])[] => {
  const left = [...lines];
  const runs: ContactLine[][] = [];
  for (let first = left.pop(); first !== undefined; first = left.pop()) {
    const run = [first];
    for (const at of run)
      for (let i = left.length - 1; i >= 0; i -= 1) {
        const other = left[i];
        if (other !== undefined && joined(at, other)) run.push(...left.splice(i, 1));
      }
    runs.push(run);
  }
  return runs;
};

/** The pieces of the given parts and the seams between them. */
export const seamsOf = (
  section: Section,
  parts: readonly SectionPart[],
): Readonly<{ pieces: readonly Piece[]; seams: readonly Seam[] }> => {
  const pieces = parts.flatMap((part) => part.regions.map((region): Piece => ({ part, region })));
  const byEnds = new Map<string, { ends: readonly [number, number]; lines: ContactLine[] }>();
  for (const { parts: pair, lines } of section.contacts)
    for (const line of lines) {
      const middle = pointOnEdge(arcEdge(line), 0.5);
      const ends = [pieceAt(pieces, pair[0], middle), pieceAt(pieces, pair[1], middle)] as const;
      if (ends[0] < 0 || ends[1] < 0) continue;
      const known = byEnds.get(ends.join()) ?? { ends, lines: [] };
      known.lines.push(line);
      byEnds.set(ends.join(), known);
    }
  const seams = [...byEnds.values()].flatMap(({ ends, lines }) =>
    runsOf(lines).map((run): Seam => ({
      ends,
      lines: run,
      width: run.reduce((sum, line) => sum + lineLength(line), 0),
    })),
  );
  return { pieces, seams };
};
