import "server-only";
import * as bay from "@/lib/schemas/bay";
import * as comment from "@/lib/schemas/comment";
import { PageQuery } from "@/lib/schemas/common";
import { RevisionComparison } from "@/lib/schemas/compare";
import * as drawing from "@/lib/schemas/drawing";
import { FinderPage, FindShapesQuery } from "@/lib/schemas/find-shapes";
import * as saved from "@/lib/schemas/saved-search";
import * as shape from "@/lib/schemas/shape";
import { PutTagsInput } from "@/lib/schemas/tag";
import * as take from "@/lib/schemas/take";
import { GONE, del, get, patch, post, put, type Operation } from "./operation";

const N = "/shapes/{id}/revisions/{n}";
const record = { answer: shape.RevisionRecord, version: true } as const;
const sheet = { answer: shape.ShapeSheet } as const;

export const RACK_OPERATIONS: readonly Operation[] = [
  get("/drawings", "drawing.list", "One's own drawings", { query: PageQuery, answer: drawing.DrawingPage }),
  post("/drawings", "drawing.create", "Keep a drawing", {
    body: drawing.CreateDrawingInput,
    answer: drawing.DrawingRecord,
    status: 201,
  }),
  get("/drawings/{id}", "drawing.show", "A drawing of one's own", { answer: drawing.DrawingRecord }),
  patch("/drawings/{id}", "drawing.update", "Save or rename a drawing", {
    body: drawing.UpdateDrawingInput,
    answer: drawing.DrawingRecord,
    version: true,
  }),
  del("/drawings/{id}", "drawing.delete", "Delete a drawing; it can be restored", GONE),
  post("/drawings/{id}/restore", "drawing.restore", "Undo a deletion", { answer: drawing.DrawingRecord }),
  post("/drawings/{id}/duplicate", "drawing.duplicate", "Copy a drawing", {
    answer: drawing.DrawingRecord,
    status: 201,
  }),

  get("/shapes", "shape.find", "Search the Rack", { query: FindShapesQuery, answer: FinderPage }),
  get("/shapes/export.csv", "shape.export", "All hits of a search as CSV", {
    query: FindShapesQuery,
    media: "text/csv",
  }),
  get("/shapes/export.json", "shape.export", "All hits of a search as JSON", {
    query: FindShapesQuery,
    media: "application/json",
  }),
  post("/shapes", "shape.create", "Save a drawing as a shape's first draft", {
    body: shape.CreateShapeInput,
    ...sheet,
    status: 201,
  }),
  get("/shapes/{id}", "shape.show", "A shape's sheet (?revision=n for another revision)", sheet),
  patch("/shapes/{id}", "shape.update", "Change designation, title, family or bay", {
    body: shape.UpdateShapeInput,
    ...sheet,
    version: true,
  }),
  put("/shapes/{id}/tags", "shape.tag", "Put tags on a shape", {
    body: PutTagsInput,
    ...sheet,
    version: true,
  }),
  get("/shapes/{id}/figure.svg", "shape.figure", "The figure", { media: "image/svg+xml" }),
  get("/shapes/{id}/uses", "shape.uses", "What is built on a shape", { answer: shape.ShapeUses }),
  get("/shapes/{id}/deeds", "shape.deeds", "The deeds of a shape", { answer: comment.ShapeDeedList }),
  get("/shapes/{id}/compare", "revision.compare", "Two revisions side by side (?from=1&to=2)", {
    answer: RevisionComparison,
  }),
  get("/shapes/{id}/revisions", "revision.list", "The revisions in short", { answer: shape.RevisionList }),
  post("/shapes/{id}/revisions", "revision.create", "Begin a further revision; If-Match is the shape's", {
    body: shape.CreateRevisionInput,
    ...record,
    status: 201,
  }),
  get(N, "revision.show", "A revision in full", { answer: shape.RevisionRecord }),
  patch(N, "revision.update", "Save a draft", { body: shape.UpdateRevisionInput, ...record }),
  del(N, "revision.discard", "Throw a draft away", GONE),
  post(`${N}/submit`, "revision.submit", "Submit a draft", record),
  post(`${N}/check`, "revision.check", "Record a check", { body: shape.CheckRevisionInput, ...record }),
  post(`${N}/send-back`, "revision.sendBack", "Send back with a reason", {
    body: shape.SendBackRevisionInput,
    ...record,
  }),
  post(`${N}/release`, "revision.release", "Release", record),
  post(`${N}/withdraw`, "revision.withdraw", "Withdraw with a reason", {
    body: shape.WithdrawRevisionInput,
    ...record,
  }),
  get("/shapes/{id}/takes", "take.list", "Which jobs took a shape", { answer: take.TakeList }),
  post("/shapes/{id}/takes", "take.create", "Record that a job took the released revision", {
    body: take.CreateTakeInput,
    answer: take.Take,
    status: 201,
  }),
  del("/shapes/{id}/takes/{take}", "take.delete", "Take a wrong entry off", { status: 204 }),
  get("/shapes/{id}/comments", "comment.list", "What was said about a shape", {
    answer: comment.CommentList,
  }),
  post("/shapes/{id}/comments", "comment.create", "Say something about a shape", {
    body: comment.CreateCommentInput,
    answer: comment.Comment,
    status: 201,
  }),
  del("/shapes/{id}/comments/{comment}", "comment.delete", "Take one's own comment back", { status: 204 }),
  get("/saved-searches", "savedSearch.list", "One's own searches", { answer: saved.SavedSearchList }),
  post("/saved-searches", "savedSearch.create", "Keep a search", {
    body: saved.CreateSavedSearchInput,
    answer: saved.SavedSearch,
    status: 201,
  }),
  patch("/saved-searches/{id}", "savedSearch.update", "Change a search", {
    body: saved.UpdateSavedSearchInput,
    answer: saved.SavedSearch,
    version: true,
  }),
  del("/saved-searches/{id}", "savedSearch.delete", "Delete a search", GONE),

  get("/bays", "bay.list", "The bays, with one's own right in each", { answer: bay.BayList }),
  post("/bays", "bay.create", "Add a bay", { body: bay.CreateBayInput, answer: bay.Bay, status: 201 }),
  patch("/bays/{id}", "bay.update", "Rename, move or set up a bay", {
    body: bay.UpdateBayInput,
    answer: bay.Bay,
    version: true,
  }),
  del("/bays/{id}", "bay.delete", "Delete an empty bay", GONE),
];
