import "server-only";
import * as invitation from "@/lib/schemas/invitation";
import * as organisation from "@/lib/schemas/organisation";
import * as properties from "@/lib/schemas/properties";
import * as session from "@/lib/schemas/session";
import { Waiting } from "@/lib/schemas/work";
import { del, get, patch, post, put, type Operation } from "./operation";

export const ACCOUNT_OPERATIONS: readonly Operation[] = [
  get("/openapi.json", "openapi.show", "This description", { media: "application/json" }),
  post("/session", "session.open", "Sign in", { body: session.SignInInput, answer: session.Me, status: 201 }),
  get("/session", "session.show", "Who is signed in", { answer: session.Me }),
  del("/session", "session.close", "Sign out", { status: 204 }),
  get("/sessions", "session.list", "One's own open sessions", { answer: session.SessionList }),
  del("/sessions/{id}", "session.end", "End one of one's own sessions", { status: 204 }),
  get("/me", "me.show", "Oneself: rights and settings", { answer: session.Me }),
  patch("/me", "me.update", "Change one's settings", {
    body: session.UpdateMeInput,
    answer: session.Me,
    version: true,
  }),
  put("/me/password", "me.changePassword", "Change one's password", {
    body: session.ChangePasswordInput,
    status: 204,
  }),
  post("/password-resets", "passwordReset.request", "Ask for a link to a new password", {
    body: invitation.RequestResetInput,
    status: 202,
  }),
  post(
    "/password-resets/complete",
    "passwordReset.complete",
    "Choose a new password with the link's secret",
    {
      body: invitation.CompleteResetInput,
      status: 204,
    },
  ),
  get("/organisation", "organisation.show", "The firm", { answer: organisation.Organisation }),
  patch("/organisation", "organisation.update", "Change the firm's settings", {
    body: organisation.UpdateOrganisationInput,
    answer: organisation.Organisation,
    version: true,
  }),
  get("/waiting", "work.waiting", "What waits for oneself", { answer: Waiting }),
  post("/properties", "properties.compute", "Properties of a drawing; nothing is stored", {
    body: properties.ComputePropertiesInput,
    answer: properties.ComputedProperties,
  }),
];
