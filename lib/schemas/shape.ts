import { z } from "zod";
import { DrawingV1 } from "@/lib/drawing/schema";
import { FAMILY_DIMENSIONS, type Family } from "@/lib/profiles/families";
import { Right } from "./access";
import { FiguresSource } from "./bay";
import { Id, Moment, Person, plainText, Version } from "./common";
import { Designation } from "./designation";
import { Properties } from "./properties";

const PROFILE_FAMILIES = Object.keys(FAMILY_DIMENSIONS) as Family[];

/** Families of shapes: those of profiles, and what is built up or drawn. */
export const SHAPE_FAMILIES = [
  ...PROFILE_FAMILIES,
  "plate-girder",
  "plate-girder-unequal",
  "crane-girder",
  "box-girder",
  "cover-plated-beam",
  "double-angle",
  "twin-channel",
  "cruciform",
  "flitch-beam",
  "built-up",
  "custom",
] as const;
export const ShapeFamily = z.enum(SHAPE_FAMILIES);
export type ShapeFamily = z.infer<typeof ShapeFamily>;

export const STATES = ["draft", "submitted", "released", "superseded", "withdrawn"] as const;
export const RevisionState = z.enum(STATES);
export type RevisionState = z.infer<typeof RevisionState>;

export const CheckedHow = z.enum(["independent calculation", "hand check", "review", "computation"]);
export type CheckedHow = z.infer<typeof CheckedHow>;

export const CreateShapeInput = z.strictObject({
  bayId: Id,
  family: ShapeFamily,
  designation: Designation,
  title: plainText(200).optional(),
  note: plainText(2000).optional(),
  drawing: DrawingV1,
});
export type CreateShapeInput = z.infer<typeof CreateShapeInput>;

export const UpdateShapeInput = z.strictObject({
  bayId: Id.optional(),
  family: ShapeFamily.optional(),
  designation: Designation.optional(),
  title: plainText(200).optional(),
});
export type UpdateShapeInput = z.infer<typeof UpdateShapeInput>;

export const CreateRevisionInput = z.strictObject({ drawing: DrawingV1, note: plainText(2000).optional() });
export type CreateRevisionInput = z.infer<typeof CreateRevisionInput>;

export const UpdateRevisionInput = z.strictObject({
  drawing: DrawingV1.optional(),
  note: plainText(2000).optional(),
});
export type UpdateRevisionInput = z.infer<typeof UpdateRevisionInput>;

export const CheckRevisionInput = z.strictObject({
  how: z.enum(["independent calculation", "hand check", "review"]),
  note: plainText(2000).optional(),
});
export type CheckRevisionInput = z.infer<typeof CheckRevisionInput>;

export const SendBackRevisionInput = z.strictObject({ reason: plainText(2000, 1) });
export type SendBackRevisionInput = z.infer<typeof SendBackRevisionInput>;

export const WithdrawRevisionInput = z.strictObject({
  reason: plainText(2000, 1),
  /** The shape to use instead. */
  replacementShapeId: Id.nullable().optional(),
});
export type WithdrawRevisionInput = z.infer<typeof WithdrawRevisionInput>;

const deed = z.strictObject({ by: Person, at: Moment });

export const RevisionItem = z.strictObject({
  ordinal: z.number().int(),
  /** A, B, C …, Z, AA. */
  letter: z.string(),
  state: RevisionState,
  note: z.string(),
  author: Person,
  editors: z.array(Person),
  submitted: deed.nullable(),
  checked: deed.extend({ how: CheckedHow, note: z.string() }).nullable(),
  sentBack: deed.extend({ reason: z.string() }).nullable(),
  released: deed.nullable(),
  supersededAt: Moment.nullable(),
  withdrawn: deed
    .extend({
      reason: z.string(),
      replacement: z.strictObject({ id: Id, designation: z.string() }).nullable(),
    })
    .nullable(),
  /** The delivery that brought it, if one did. */
  deliveryId: Id.nullable(),
  contentHash: z.string(),
  createdAt: Moment,
  updatedAt: Moment,
  version: Version,
});
export type RevisionItem = z.infer<typeof RevisionItem>;

export const RevisionRecord = RevisionItem.extend({
  drawing: DrawingV1,
  engineVersion: z.string(),
  computed: Properties,
  /** Tabulated values by property key, where the revision came from a table. */
  tabulated: z.record(z.string(), z.number()).nullable(),
  /** What the asker may do with it now; the server asks again. */
  may: z.strictObject({
    edit: z.boolean(),
    submit: z.boolean(),
    check: z.boolean(),
    sendBack: z.boolean(),
    release: z.boolean(),
    withdraw: z.boolean(),
    revise: z.boolean(),
  }),
});
export type RevisionRecord = z.infer<typeof RevisionRecord>;

export const RevisionList = z.strictObject({ items: z.array(RevisionItem) });
export type RevisionList = z.infer<typeof RevisionList>;

/** The shape's sheet: what it is, one revision in full (the released one unless asked), and the others in short. */
export const ShapeSheet = z.strictObject({
  id: Id,
  designation: z.string(),
  title: z.string(),
  family: ShapeFamily,
  series: z.string(),
  tags: z.array(z.string()),
  bay: z.strictObject({ id: Id, name: z.string(), ordinal: z.number().int(), counts: FiguresSource }),
  right: Right,
  releasedOrdinal: z.number().int().nullable(),
  workingOrdinal: z.number().int().nullable(),
  revision: RevisionRecord,
  /** Which of computed and tabulated counts in this bay for this revision. */
  counts: FiguresSource,
  revisions: z.array(RevisionItem),
  version: Version,
  createdAt: Moment,
  updatedAt: Moment,
});
export type ShapeSheet = z.infer<typeof ShapeSheet>;

/** What is built on a shape, as far as the asker may see it: one's own drawings, and revisions of shapes. */
export const ShapeUses = z.strictObject({
  items: z.array(
    z.strictObject({
      kind: z.enum(["drawing", "revision"]),
      id: Id,
      name: z.string(),
      /** The revision of this shape that was used. */
      ordinal: z.number().int(),
      author: Person,
    }),
  ),
});
export type ShapeUses = z.infer<typeof ShapeUses>;
