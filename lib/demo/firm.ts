import type { Role } from "@/lib/schemas/access";

/** The firm of the demo, its people and its bays: all invented. */
export const FIRM = {
  name: "Harrow & Tide Fabrication",
  address: "Slipway Works, 4 Tide Street, Harrow Quay",
} as const;

export const DEMO_PASSWORD = "flitchbook-demo";

export const DEMO_PEOPLE: readonly Readonly<{ email: string; name: string; role: Role }>[] = [
  { email: "admin@harrowtide.example", name: "J. Harrow", role: "admin" },
  { email: "librarian@harrowtide.example", name: "R. Okafor", role: "librarian" },
  { email: "engineer@harrowtide.example", name: "A. Lindqvist", role: "engineer" },
  { email: "designer@harrowtide.example", name: "T. Nakamura", role: "designer" },
];

export const DEMO_BAYS = [
  "Rolled beams",
  "Rolled columns",
  "Channels and tees",
  "Plate girders",
  "Crane girders",
  "Boxes",
  "Flitch beams",
  "Job specials",
] as const;

export type DemoBay = (typeof DEMO_BAYS)[number];
