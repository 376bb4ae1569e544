import "server-only";
import * as invitation from "@/lib/schemas/invitation";
import { LetterList } from "@/lib/schemas/letter";
import { LogPage, LogQuery } from "@/lib/schemas/log";
import * as member from "@/lib/schemas/member";
import * as request from "@/lib/schemas/right-request";
import * as token from "@/lib/schemas/token";
import { del, get, patch, post, put, type Operation } from "./operation";

export const OFFICE_OPERATIONS: readonly Operation[] = [
  get("/members", "member.list", "Members with their grants", { answer: member.MemberList }),
  patch("/members/{id}", "member.update", "Change a role, suspend or restore", {
    body: member.UpdateMemberInput,
    answer: member.Member,
    version: true,
  }),
  del("/members/{id}/sessions", "member.endSessions", "Sign a member out everywhere", { status: 204 }),
  get("/rights", "right.list", "Grants beside the roles", { answer: member.RightList }),
  put("/rights", "right.put", "Grant, change or take away a right", {
    body: member.PutRightInput,
    answer: member.RightList,
  }),
  get("/right-requests", "rightRequest.list", "Requests for rights", { answer: request.RightRequestList }),
  post("/right-requests", "rightRequest.create", "Ask for a right", {
    body: request.CreateRightRequestInput,
    answer: request.RightRequest,
    status: 201,
  }),
  patch("/right-requests/{id}", "rightRequest.decide", "Grant or refuse a request", {
    body: request.DecideRightRequestInput,
    answer: request.RightRequest,
    version: true,
  }),
  get("/invitations", "invitation.list", "Invitations", { answer: invitation.InvitationList }),
  post("/invitations", "invitation.create", "Invite somebody by letter", {
    body: invitation.CreateInvitationInput,
    answer: invitation.Invitation,
    status: 201,
  }),
  del("/invitations/{id}", "invitation.revoke", "Take an invitation back", { status: 204 }),
  post("/invitations/open", "invitation.show", "What an invitation says; changes nothing", {
    body: invitation.ShowInvitationInput,
    answer: invitation.ShownInvitation,
  }),
  post("/invitations/accept", "invitation.accept", "Accept an invitation", {
    body: invitation.AcceptInvitationInput,
    status: 201,
  }),
  get("/tokens", "token.list", "Tokens", { answer: token.TokenList }),
  post("/tokens", "token.create", "Make a token; it is answered once", {
    body: token.CreateTokenInput,
    answer: token.CreatedToken,
    status: 201,
  }),
  del("/tokens/{id}", "token.revoke", "Revoke a token", { status: 204 }),
  get("/letters", "letter.list", "Letters and how far they came", { answer: LetterList }),
  get("/log/export.csv", "log.export", "The log as CSV", { query: LogQuery, media: "text/csv" }),
  get("/log", "log.list", "The log of deeds", { query: LogQuery, answer: LogPage }),
];
