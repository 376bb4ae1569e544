/** The areas that have a room, in the order of their tabs; Alt+1… opens them. */
export const AREAS = [
  { id: "bench", name: "Bench", href: "/bench" },
  { id: "rack", name: "Rack", href: "/rack" },
  { id: "goods-in", name: "Goods-in", href: "/goods-in" },
  { id: "office", name: "Office", href: "/office" },
] as const;

export type AreaId = (typeof AREAS)[number]["id"];
