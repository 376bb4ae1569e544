import type { Ctx } from "@/lib/services/context";
import type { Drawing } from "@/lib/drawing/schema";
import { createShape } from "@/lib/services/shape/create";
import { checkRevision } from "@/lib/services/revision/check";
import { releaseRevision } from "@/lib/services/revision/release";
import { submitRevision } from "@/lib/services/revision/submit";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";
import type { TestOrganisation } from "@/tests/helpers/test-organisation";

let numbered = 0;
export const nextDesignation = (): string => `PL ${(numbered += 1)}`;

type Plate = Readonly<{ designation?: string; depth?: number; bayId?: string; drawing?: Drawing }>;

export const makeDraft = (org: TestOrganisation, ctx: Ctx, plate: Plate = {}) =>
  createShape({
    ctx,
    input: {
      bayId: plate.bayId ?? org.bayIds[0],
      family: "custom",
      designation: plate.designation ?? nextDesignation(),
      drawing: plate.drawing ?? rectangleDrawing(20, plate.depth ?? 200),
    },
  });

export const makeSubmitted = async (org: TestOrganisation, ctx: Ctx, plate: Plate = {}) => {
  const draft = await makeDraft(org, ctx, plate);
  const revision = await submitRevision({ ctx, shapeId: draft.id, ordinal: 1, version: 1 });
  return { id: draft.id, revision };
};

/** Drafted and submitted by the engineer, checked and released by the librarian. */
export const makeReleased = async (org: TestOrganisation, plate: Plate = {}) => {
  const { id, revision } = await makeSubmitted(org, org.as("engineer"), plate);
  const address = { ctx: org.as("librarian"), shapeId: id, ordinal: 1 };
  const checked = await checkRevision({
    ...address,
    version: revision.version,
    input: { how: "hand check" },
  });
  const released = await releaseRevision({ ...address, version: checked.version });
  return { id, revision: released };
};
