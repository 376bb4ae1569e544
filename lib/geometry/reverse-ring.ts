import type { Ring, Vertex } from "@/lib/geometry/region";

/** The same ring run the other way: anticlockwise becomes clockwise, and each bulge changes sign with its edge. */
export const reverseRing = (ring: Ring): Ring =>
  ring.map((_, i): Vertex => {
    const at = ring[ring.length - 1 - i];
    const next = ring[(2 * ring.length - 2 - i) % ring.length];
    if (at === undefined || next === undefined) throw new Error("reverseRing: index outside the ring");
    const bulge = next.bulge ?? 0;
    return bulge === 0 ? { x: at.x, y: at.y } : { x: at.x, y: at.y, bulge: -bulge };
  });
