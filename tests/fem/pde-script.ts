import type { Point, Region, Ring } from "@/lib/geometry/region";

/** Lengths of boundary to one edge of the first mesh, as a share of the square root of the area. */
const FIRST_EDGE = 0.12;
/** Least number of mesh edges on a drawn edge. */
const LEAST = 4;
const ROUNDS = 7;
/** Largest element of the last mesh over the mean thickness, twice the area over the perimeter. */
const FINEST = 0.4;

const borderOf = (
  ring: Ring,
  name: string,
): readonly Readonly<{ name: string; text: string; length: number }>[] =>
  ring.map((from, i) => {
    const to = ring[(i + 1) % ring.length] ?? from;
    return {
      name: `${name}x${i}`,
      text: `border ${name}x${i}(t=0,1){x=${from.x}+t*(${to.x - from.x});y=${from.y}+t*(${to.y - from.y});label=1;}`,
      length: Math.hypot(to.x - from.x, to.y - from.y),
    };
  });

const around = (region: Region, centre: Point): readonly Ring[] =>
  [region.outer, ...region.holes].map((ring) =>
    ring.map(({ x, y }) => ({ x: x - centre.x, y: y - centre.y })),
  );

/**
 * A script for a general solver of partial differential equations: Saint-Venant's warping function of a polygon by
 * quadratic elements on a mesh adapted again and again, printing J, xs, ys (from the centroid) and Cw.
 * @param region straight edges, mm; outer ring anticlockwise, holes clockwise.
 * @param centre the centroid; `area` mm².
 */
export const pdeScript = (region: Region, centre: Point, area: number): string => {
  const borders = around(region, centre).flatMap((ring, r) => borderOf(ring, `b${r}`));
  const step = FIRST_EDGE * Math.sqrt(area);
  const pieces = borders.map(({ name, length }) => `${name}(${Math.max(LEAST, Math.ceil(length / step))})`);
  const perimeter = borders.reduce((sum, { length }) => sum + length, 0);
  const hmax = (FINEST * 2 * area) / perimeter;
  return [
    "verbosity=0;",
    ...borders.map(({ text }) => text),
    `mesh Th=buildmesh(${pieces.join("+")});`,
    "fespace Vh(Th,P2); Vh w,v;",
    `for(int i=0;i<=${ROUNDS};i++){`,
    "  solve P(w,v,solver=sparsesolver)=int2d(Th)(dx(w)*dx(v)+dy(w)*dy(v))+int2d(Th)(1e-12*w*v)",
    "    -int2d(Th)(y*dx(v)-x*dy(v));",
    `  if(i<${ROUNDS}) Th=adaptmesh(Th,w,err=0.02/(2.0^i),nbvx=400000,ratio=1.8,hmax=${hmax}*2.0^(${ROUNDS}-1-i));`,
    "}",
    "real A=int2d(Th)(1.), Ixx=int2d(Th)(y*y), Iyy=int2d(Th)(x*x), Ixy=int2d(Th)(x*y), D=Ixx*Iyy-Ixy*Ixy;",
    "real J=int2d(Th)((dx(w)-y)^2+(dy(w)+x)^2);",
    "real m=int2d(Th)(w)/A, Iwx=int2d(Th)((w-m)*x), Iwy=int2d(Th)((w-m)*y);",
    "real xs=(Ixy*Iwx-Iyy*Iwy)/D, ys=(Ixx*Iwx-Ixy*Iwy)/D;",
    "real Cw=int2d(Th)((w-m-ys*x+xs*y)^2);",
    "cout.precision(12);",
    'cout<<"RESULT "<<J<<" "<<xs<<" "<<ys<<" "<<Cw<<" "<<Th.nt<<endl;',
  ].join("\n");
};
